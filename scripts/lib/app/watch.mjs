import { readFileSync } from 'node:fs'
import { Failure, failureText } from '../failure.mjs'
import { lastLines } from '../child-processes.mjs'
import { isLeaving, leave } from '../teardown.mjs'

/**
 * When one of the two ends by itself, the other is of no use: say which and why, and stop.
 * @param {string} name
 * @param {import('node:child_process').ChildProcess} child
 * @param {string} [log] where it wrote what it had to say
 */
export function leaveWhenEnds(name, child, log) {
  const report = () => {
    if (isLeaving()) return
    const detail = log === undefined ? undefined : `${log}:\n${lastLines(readFileSync(log, 'utf8'), 16)}`
    const ending = child.signalCode ?? `exit code ${child.exitCode}`
    console.error(`\n${failureText(new Failure(`${name} ended unexpectedly (${ending}).`, { detail }))}`)
    void leave(1)
  }
  child.once('exit', report)
}
