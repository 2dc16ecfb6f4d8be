import { existsSync } from 'node:fs'
import path from 'node:path'
import { asFailure, failureText } from './lib/failure.mjs'
import { rootFolder } from './lib/paths.mjs'
import { elapsedText, step } from './lib/progress.mjs'
import { isLeaving, leave, leaveOnSignals, tearDown, waitForTheEnd } from './lib/teardown.mjs'
import { CHROMIUM, MARIADB, ensureFromDebian } from './lib/setup/debian.mjs'
import { ensureNodeModules, requireNode } from './lib/setup/node-modules.mjs'
import { chooseStages } from './lib/testing/stages.mjs'
import { runStage, runVerdicts } from './lib/testing/run-stage.mjs'
import { exitCodeOf, lastLine, summaryTable } from './lib/testing/summary.mjs'

const INTERRUPTED = 130
const begin = Date.now()

leaveOnSignals(() => {
  console.log('\nInterrupted; stopping what was started.')
  return INTERRUPTED
})

/** @param {import('./lib/testing/stages.mjs').Stage[]} stages */
async function setUp(stages) {
  const needsDatabase = stages.some(({ needs }) => needs === 'database')
  requireNode()
  if (needsDatabase) await ensureFromDebian(MARIADB)
  if (stages.some(({ kind }) => kind === 'playwright')) await ensureFromDebian(CHROMIUM)
  await ensureNodeModules(rootFolder)
  if (!existsSync(path.join(rootFolder, '.nuxt', 'tsconfig.app.json'))) {
    const { prepareNuxt } = await import('./lib/app/build.mjs')
    await step('Generated types', () => prepareNuxt(rootFolder))
  }
  if (!needsDatabase) return process.env
  const { testEnvironment } = await import('./lib/testing/environment.mjs')
  return testEnvironment()
}

async function test() {
  const { stages, passedOn } = chooseStages(process.argv.slice(2))
  const environment = await setUp(stages)
  const surroundings = { environment, passedOn }
  const results = await runVerdicts(
    stages.filter(({ kind }) => kind === 'verdict'),
    surroundings,
  )
  for (const stage of stages.filter(({ kind }) => kind !== 'verdict')) {
    if (isLeaving()) await waitForTheEnd()
    const result = await runStage(stage, surroundings)
    results.push(result)
    // Without a build there is nothing that the later stages could run against.
    if (stage.kind === 'build' && result.failed > 0) break
  }
  return results
}

try {
  const results = await test()
  if (isLeaving()) await waitForTheEnd()
  await tearDown()
  console.log(`\n${summaryTable(results)}\n\nafter ${elapsedText(Date.now() - begin)}`)
  console.log(lastLine(results))
  process.exit(exitCodeOf(results))
} catch (error) {
  if (isLeaving()) await waitForTheEnd()
  console.error(`\n${failureText(asFailure(error))}\n`)
  await tearDown()
  console.log('0 passed, 1 failed')
  await leave(1)
  process.exit(1)
}
