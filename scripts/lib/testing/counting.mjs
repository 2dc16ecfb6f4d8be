/**
 * How many tests of a stage passed and failed.
 * @typedef {object} Count
 * @property {number} passed
 * @property {number} failed
 * @property {number} skipped
 * @property {string[]} notes why something counts as failed although no test said so
 */

/** @typedef {{ status: string, assertionResults: unknown[] }} VitestFile */
/** @typedef {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number, testResults: VitestFile[] }} VitestReport */
/** @typedef {{ stats: { expected: number, unexpected: number, flaky: number, skipped: number }, errors?: unknown[] }} PlaywrightReport */

/**
 * A stage that is either right or wrong as a whole, such as lint.
 * @param {number} exitCode
 * @returns {Count}
 */
export function countVerdict(exitCode) {
  return { passed: exitCode === 0 ? 1 : 0, failed: exitCode === 0 ? 0 : 1, skipped: 0, notes: [] }
}

/**
 * @param {VitestReport | undefined} report nothing when the runner left none
 * @param {number} exitCode
 * @returns {Count}
 */
export function countVitest(report, exitCode) {
  if (!report) return crashed()
  // A file that cannot even be loaded has no tests to fail; it must count all the same.
  const unloadable = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  ).length
  return complete(exitCode, {
    passed: report.numPassedTests,
    failed: report.numFailedTests + unloadable,
    skipped: report.numPendingTests + report.numTodoTests,
    notes: unloadable > 0 ? [`${unloadable} test file(s) could not be run`] : [],
  })
}

/**
 * @param {PlaywrightReport | undefined} report nothing when the runner left none
 * @param {number} exitCode
 * @returns {Count}
 */
export function countPlaywright(report, exitCode) {
  if (!report) return crashed()
  const { expected, unexpected, flaky, skipped } = report.stats
  // Passing at the second attempt only is a failure that has not been understood yet.
  const notes = flaky > 0 ? [`${flaky} test(s) passed only when repeated`] : []
  return complete(exitCode, { passed: expected, failed: unexpected + flaky, skipped, notes })
}

/**
 * Adds what the plain numbers do not show: skipped tests, stages without tests, a runner that ended badly.
 * @param {number} exitCode
 * @param {Count} count
 * @returns {Count}
 */
function complete(exitCode, { passed, failed, skipped, notes }) {
  const more = [...notes]
  let failures = failed
  if (skipped > 0) {
    failures += skipped
    more.push(`${skipped} test(s) skipped, which counts as failed`)
  }
  if (passed + failures === 0) {
    failures += 1
    more.push('no test ran')
  }
  if (exitCode !== 0 && failures === 0) {
    failures += 1
    more.push(`the runner ended with exit code ${exitCode}`)
  }
  return { passed, failed: failures, skipped, notes: more }
}

/** @returns {Count} */
function crashed() {
  return { passed: 0, failed: 1, skipped: 0, notes: ['the runner crashed'] }
}
