import { parentOf } from './process-table.mjs'

const WATCH_MILLISECONDS = 500

/**
 * What this process has started, so that leaving (in whatever way) stops exactly that, last started first stopped.
 */
/** @type {{ name: string, stop: () => unknown }[]} */
const started = []
let leaving = false

/** True once the process is on its way out: nothing new may be started then. */
export function isLeaving() {
  return leaving
}

/**
 * Remembers how to stop something.
 * @param {string} name
 * @param {() => unknown} stop
 * @returns {() => void} call it once the thing has ended by itself
 */
export function onTeardown(name, stop) {
  const entry = { name, stop }
  started.push(entry)
  return () => {
    const index = started.indexOf(entry)
    if (index >= 0) started.splice(index, 1)
  }
}

/** Stops everything, in reverse order. A failure to stop one thing does not spare the others. */
export async function tearDown() {
  leaving = true
  for (let entry = started.pop(); entry; entry = started.pop()) {
    try {
      await entry.stop()
    } catch (error) {
      console.error(`Stopping ${entry.name} failed: ${error instanceof Error ? error.message : error}`)
    }
  }
}

/**
 * Stops everything and leaves.
 * @param {number} exitCode
 */
export async function leave(exitCode) {
  if (leaving) return
  await tearDown()
  process.exit(exitCode)
}

/**
 * Ctrl-C, a termination request and a closed terminal all take the same way out.
 * @param {(signal: string) => number} exitCodeFor says goodbye and gives the exit code
 */
export function leaveOnSignals(exitCodeFor) {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    // Stays registered: npm forwards a second SIGINT, which must not cut the teardown short.
    process.on(signal, () => {
      if (!leaving) void leave(exitCodeFor(signal))
    })
  }
  if (process.env.npm_lifecycle_event) leaveWithNpm(() => void leave(exitCodeFor('SIGTERM')))
}

/**
 * npm runs us through a shell. Ending npm ends at most that shell and passes nothing on to us; we would stay behind,
 * holding the port. So both are watched.
 * @param {() => void} goodbye
 */
function leaveWithNpm(goodbye) {
  const lineage = () => `${process.ppid} ${parentOf(process.ppid)}`
  const original = lineage()
  const watch = setInterval(() => {
    if (leaving || lineage() === original) return
    clearInterval(watch)
    goodbye()
  }, WATCH_MILLISECONDS)
  watch.unref()
}

/** Never resolves: for a step overtaken by the teardown, which will end the process. @returns {Promise<never>} */
export function waitForTheEnd() {
  return new Promise(() => setInterval(() => {}, 60_000))
}
