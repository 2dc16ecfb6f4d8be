import { spawn } from 'node:child_process'
import { Failure } from './failure.mjs'
import { isLeaving, onTeardown } from './teardown.mjs'

const KEPT_OUTPUT_CHARACTERS = 64_000

/** @typedef {{ code: number, output: string }} Outcome */

/**
 * Starts a program in a process group of its own. Ctrl-C in a terminal reaches every process of the foreground
 * group at once; apart from it, we alone decide what stops when.
 * @param {string} command
 * @param {string[]} parameters
 * @param {import('node:child_process').SpawnOptions} [options]
 */
export function startApart(command, parameters, options = {}) {
  if (isLeaving()) throw new Failure('Stopping: nothing new is started.')
  return spawn(command, parameters, { ...options, detached: true })
}

/** Whether the process has ended. @param {import('node:child_process').ChildProcess} child */
export function hasEnded(child) {
  return child.exitCode !== null || child.signalCode !== null || child.pid === undefined
}

/**
 * Asks a program and its children to stop, and makes them when they do not within the time given.
 * @param {import('node:child_process').ChildProcess} child
 * @param {{ signal?: NodeJS.Signals, patienceMilliseconds?: number }} [options]
 */
export async function stopGroup(child, { signal = 'SIGTERM', patienceMilliseconds = 10_000 } = {}) {
  if (hasEnded(child)) return
  const ended = new Promise((resolve) => child.once('exit', resolve))
  signalGroup(child, signal)
  const timer = setTimeout(() => signalGroup(child, 'SIGKILL'), patienceMilliseconds)
  await ended
  clearTimeout(timer)
}

/** @param {import('node:child_process').ChildProcess} child @param {NodeJS.Signals} signal */
function signalGroup(child, signal) {
  try {
    process.kill(-Number(child.pid), signal)
  } catch {
    // The group is gone already, which is what was wanted.
  }
}

/**
 * Runs a program to its end. Its output is kept for the message if it fails, or shown as it comes.
 * @param {string} command
 * @param {string[]} parameters
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, show?: boolean, limitMilliseconds?: number }} [options]
 * @returns {Promise<Outcome>}
 */
export function runToEnd(command, parameters, { cwd, env, show = false, limitMilliseconds } = {}) {
  const child = startApart(command, parameters, {
    cwd,
    env,
    stdio: show ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
  })
  const forget = onTeardown(command, () => stopGroup(child))
  let output = ''
  const keep = (/** @type {Buffer} */ chunk) => {
    output = (output + chunk).slice(-KEPT_OUTPUT_CHARACTERS)
  }
  child.stdout?.on('data', keep)
  child.stderr?.on('data', keep)
  const limit =
    limitMilliseconds &&
    setTimeout(() => {
      output += `\nStopped: it took longer than ${limitMilliseconds / 60_000} minutes.`
      void stopGroup(child)
    }, limitMilliseconds)
  return new Promise((resolve) => {
    const end = (/** @type {Outcome} */ outcome) => {
      clearTimeout(limit)
      forget()
      resolve(outcome)
    }
    child.once('error', (error) => end({ code: 127, output: `${output}\n${error.message}` }))
    child.once('close', (code) => end({ code: code ?? 1, output }))
  })
}

/** The last lines of a text, which is where programs say why they gave up. @param {string} text */
export function lastLines(text, count = 20) {
  return text.trimEnd().split('\n').slice(-count).join('\n')
}
