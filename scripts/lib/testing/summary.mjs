import { elapsedText } from '../progress.mjs'

/** @typedef {import('./counting.mjs').Count & { name: string, milliseconds: number }} StageResult */

/** @param {StageResult[]} results */
export function totals(results) {
  const passed = results.reduce((sum, result) => sum + result.passed, 0)
  const failed = results.reduce((sum, result) => sum + result.failed, 0)
  return { passed, failed }
}

/** A run in which nothing was tested proves nothing. @param {StageResult[]} results */
export function exitCodeOf(results) {
  const { passed, failed } = totals(results)
  return failed === 0 && passed > 0 ? 0 : 1
}

/** The table of all stages, without the last line. @param {StageResult[]} results */
export function summaryTable(results) {
  const rows = results.map(({ name, passed, failed, milliseconds, notes }) => {
    const figures = `${String(passed).padStart(8)}${String(failed).padStart(8)}${elapsedText(milliseconds).padStart(12)}`
    return `  ${failed > 0 ? '✗' : '✓'} ${name.padEnd(14)}${figures}${notes.length > 0 ? `   ${notes.join('; ')}` : ''}`
  })
  return [
    `    ${'stage'.padEnd(14)}${'passed'.padStart(8)}${'failed'.padStart(8)}${'time'.padStart(12)}`,
    ...rows,
  ].join('\n')
}

/** The very last line of a run. @param {StageResult[]} results */
export function lastLine(results) {
  const { passed, failed } = totals(results)
  return `${passed} passed, ${failed} failed`
}
