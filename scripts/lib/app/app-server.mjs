import { openSync } from 'node:fs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { Failure } from '../failure.mjs'
import { hasEnded, startApart, stopGroup } from '../child-processes.mjs'
import { browserAddress } from '../ports.mjs'
import { onTeardown } from '../teardown.mjs'
import { rootFolder } from '../paths.mjs'
import { builtServer } from './build.mjs'

const READY_WITHIN_MILLISECONDS = 60_000
const PAUSE_MILLISECONDS = 100
const EXIT_WITH_PARENT = pathToFileURL(path.join(rootFolder, 'scripts/lib/app/exit-with-parent.mjs')).href

/**
 * @typedef {object} AppPlan
 * @property {string} databaseUrl
 * @property {string} sessionPassword
 * @property {string} host
 * @property {number} port
 * @property {string} [log] file for what the server prints; without it, it prints to ours
 */

/** @typedef {{ child: import('node:child_process').ChildProcess, baseUrl: string, stop: () => Promise<void> }} RunningApp */

/**
 * The surroundings of the built server.
 * @param {AppPlan} plan
 * @param {NodeJS.ProcessEnv} surroundings
 * @returns {NodeJS.ProcessEnv}
 */
export function appEnvironment({ databaseUrl, sessionPassword, host, port }, surroundings) {
  /** @type {NodeJS.ProcessEnv} */
  const environment = {
    // A Secure cookie is dropped by most clients over plain http, which is what loopback serves.
    NUXT_SESSION_COOKIE_SECURE: 'false',
    NUXT_SESSION_PASSWORD: sessionPassword,
    // Open connections of a browser must not hold up Ctrl-C.
    NITRO_SHUTDOWN_TIMEOUT: '3000',
    ...surroundings,
    NODE_ENV: 'production',
    NUXT_DATABASE_URL: databaseUrl,
    HOST: host,
    PORT: String(port),
  }
  // These would take precedence over HOST and PORT.
  delete environment.NITRO_HOST
  delete environment.NITRO_PORT
  delete environment.NITRO_UNIX_SOCKET
  return environment
}

/**
 * Starts the built server and waits until it answers `GET /api/health`.
 * @param {AppPlan} plan
 * @returns {Promise<RunningApp>}
 */
export async function startApp(plan) {
  const output = plan.log === undefined ? 'inherit' : openSync(plan.log, 'a')
  const child = startApart(process.execPath, ['--import', EXIT_WITH_PARENT, builtServer(rootFolder)], {
    cwd: rootFolder,
    env: appEnvironment(plan, process.env),
    stdio: ['ignore', output, output, 'ipc'],
  })
  const stop = () => stopGroup(child)
  const forget = onTeardown('the application', stop)
  const baseUrl = browserAddress(plan)
  await waitForHealth(child, baseUrl)
  return { child, baseUrl, stop: () => stop().then(forget) }
}

/** @param {import('node:child_process').ChildProcess} child @param {string} baseUrl */
async function waitForHealth(child, baseUrl) {
  const deadline = Date.now() + READY_WITHIN_MILLISECONDS
  let last = 'no answer'
  while (Date.now() < deadline) {
    if (hasEnded(child)) {
      throw new Failure('The application ended instead of serving.', {
        todo: 'What it printed above says why.',
      })
    }
    last = await healthOf(baseUrl)
    if (last === 'healthy') return
    await new Promise((resolve) => setTimeout(resolve, PAUSE_MILLISECONDS))
  }
  throw new Failure(`The application does not report itself healthy: ${last}.`, {
    where: `${baseUrl}/api/health`,
  })
}

/** @param {string} baseUrl */
async function healthOf(baseUrl) {
  try {
    const response = await fetch(`${baseUrl}/api/health`, { signal: AbortSignal.timeout(5000) })
    return response.ok ? 'healthy' : `status ${response.status}, ${(await response.text()).slice(0, 300)}`
  } catch (error) {
    return error instanceof Error ? error.message : String(error)
  }
}
