import { describe, expect, it } from 'vitest'
import { countPlaywright, countVerdict, countVitest } from '../../../scripts/lib/testing/counting.mjs'
import { exitCodeOf, lastLine, summaryTable } from '../../../scripts/lib/testing/summary.mjs'

const vitestReport = (numbers: Partial<Parameters<typeof countVitest>[0]>) => ({
  numPassedTests: 0,
  numFailedTests: 0,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults: [],
  ...numbers,
})
const playwrightReport = (
  stats: Partial<{ expected: number; unexpected: number; flaky: number; skipped: number }>,
) => ({
  stats: { expected: 0, unexpected: 0, flaky: 0, skipped: 0, ...stats },
})

describe('counting a vitest run', () => {
  it('takes the numbers of the report', () => {
    const count = countVitest(vitestReport({ numPassedTests: 7, numFailedTests: 2 }), 1)
    expect(count).toEqual({ passed: 7, failed: 2, skipped: 0, notes: [] })
  })

  it('counts a file that could not be loaded as a failure', () => {
    const testResults = [
      { status: 'failed', assertionResults: [] },
      { status: 'failed', assertionResults: [{}] },
      { status: 'passed', assertionResults: [{}] },
    ]
    const count = countVitest(vitestReport({ numPassedTests: 1, numFailedTests: 1, testResults }), 1)
    expect(count).toMatchObject({ passed: 1, failed: 2 })
  })

  it('counts skipped and planned tests as failures, and says so', () => {
    const count = countVitest(vitestReport({ numPassedTests: 3, numPendingTests: 1, numTodoTests: 1 }), 0)
    expect(count).toMatchObject({ passed: 3, failed: 2, skipped: 2 })
    expect(count.notes.join()).toContain('2 test(s) skipped')
  })

  it('counts a run without tests as a failure', () => {
    expect(countVitest(vitestReport({}), 0)).toMatchObject({ passed: 0, failed: 1, notes: ['no test ran'] })
  })

  it('counts a bad ending after passing tests as a failure', () => {
    expect(countVitest(vitestReport({ numPassedTests: 3 }), 1)).toMatchObject({ passed: 3, failed: 1 })
  })

  it('counts a crash as a failure', () => {
    expect(countVitest(undefined, 134)).toMatchObject({ passed: 0, failed: 1, notes: ['the runner crashed'] })
    expect(countVitest(undefined, 0)).toMatchObject({ failed: 1 })
  })
})

describe('counting a Playwright run', () => {
  it('takes the numbers of the report', () => {
    expect(countPlaywright(playwrightReport({ expected: 5, unexpected: 1 }), 1)).toMatchObject({
      passed: 5,
      failed: 1,
    })
  })

  it('counts tests that passed only when repeated, and skipped ones, as failures', () => {
    const count = countPlaywright(playwrightReport({ expected: 5, flaky: 1, skipped: 2 }), 0)
    expect(count).toMatchObject({ passed: 5, failed: 3, skipped: 2 })
  })

  it('counts a server that did not start as a failure', () => {
    expect(countPlaywright(playwrightReport({}), 1)).toMatchObject({ passed: 0, failed: 1 })
    expect(countPlaywright(undefined, 1)).toMatchObject({ passed: 0, failed: 1 })
  })
})

describe('the summary', () => {
  const stage = (name: string, passed: number, failed: number, notes: string[] = []) => {
    return { name, passed, failed, skipped: 0, notes, milliseconds: 1500 }
  }

  it('adds all stages up in the last line', () => {
    const results = [stage('lint', 1, 0), stage('unit', 40, 2), stage('e2e', 6, 1)]
    expect(lastLine(results)).toBe('47 passed, 3 failed')
  })

  it('ends well only when something passed and nothing failed', () => {
    expect(exitCodeOf([stage('lint', 1, 0), stage('build', 0, 0)])).toBe(0)
    expect(exitCodeOf([stage('lint', 1, 0), stage('unit', 3, 1)])).toBe(1)
    expect(exitCodeOf([stage('build', 0, 0)])).toBe(1)
    expect(exitCodeOf([])).toBe(1)
  })

  it('shows every stage with its notes and time', () => {
    const table = summaryTable([stage('lint', 1, 0), stage('unit', 3, 1, ['1 test(s) skipped'])])
    expect(table).toMatch(/✓ lint +1 +0 +1\.5 s/)
    expect(table).toMatch(/✗ unit +3 +1 +1\.5 s +1 test\(s\) skipped/)
  })

  it('counts a stage that is right or wrong as a whole as one test', () => {
    expect(countVerdict(0)).toMatchObject({ passed: 1, failed: 0 })
    expect(countVerdict(2)).toMatchObject({ passed: 0, failed: 1 })
  })
})
