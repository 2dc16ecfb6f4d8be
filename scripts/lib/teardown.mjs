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
}

/** Never resolves: for a step overtaken by the teardown, which will end the process. @returns {Promise<never>} */
export function waitForTheEnd() {
  return new Promise(() => setInterval(() => {}, 60_000))
}
