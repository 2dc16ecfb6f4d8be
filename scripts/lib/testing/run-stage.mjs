import { mkdir, readFile, rm } from 'node:fs/promises'
import path from 'node:path'
import { runToEnd } from '../child-processes.mjs'
import { failureText } from '../failure.mjs'
import { elapsedText } from '../progress.mjs'
import { packageProgram, rootFolder } from '../paths.mjs'
import { ensureBuild } from '../app/build.mjs'
import { countPlaywright, countVerdict, countVitest } from './counting.mjs'

const REPORT_FOLDER = path.join(rootFolder, 'test-results')
// Ends a hang; a whole run takes less.
const LIMIT_MILLISECONDS = 10 * 60_000

/** @typedef {import('./stages.mjs').Stage} Stage */
/** @typedef {{ environment: NodeJS.ProcessEnv, passedOn: string[] }} Surroundings */

/**
 * Runs one stage to its end, showing what it prints as it comes.
 * @param {Stage} stage
 * @param {Surroundings} surroundings
 * @returns {Promise<import('./summary.mjs').StageResult>}
 */
export async function runStage(stage, surroundings) {
  const begin = Date.now()
  console.log(`\n── ${stage.name} ${'─'.repeat(Math.max(0, 70 - stage.name.length))}`)
  const count = await countOf(stage, surroundings)
  const milliseconds = Date.now() - begin
  console.log(
    `── ${stage.name}: ${count.passed} passed, ${count.failed} failed, ${elapsedText(milliseconds)}`,
  )
  return { ...count, name: stage.name, milliseconds }
}

/**
 * @param {Stage} stage
 * @param {Surroundings} surroundings
 * @returns {Promise<import('./counting.mjs').Count>}
 */
async function countOf(stage, surroundings) {
  if (stage.kind === 'build') return buildStage()
  if (stage.kind === 'verdict') {
    return countVerdict(await run(stage.command ?? [], surroundings.environment))
  }
  const reportFile = path.join(REPORT_FOLDER, `${stage.name}.json`)
  await mkdir(REPORT_FOLDER, { recursive: true })
  await rm(reportFile, { force: true })
  const isVitest = stage.kind === 'vitest'
  const command = isVitest ? vitestCommand(stage.name, reportFile) : ['playwright', 'test']
  const environment = { ...surroundings.environment, PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile }
  const exitCode = await run([...command, ...surroundings.passedOn], environment)
  const report = await readReport(reportFile)
  return isVitest ? countVitest(report, exitCode) : countPlaywright(report, exitCode)
}

/** @param {string} project @param {string} reportFile */
function vitestCommand(project, reportFile) {
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`]
  return ['vitest', 'run', '--project', project, ...reporters]
}

/** @param {string[]} command @param {NodeJS.ProcessEnv} environment */
async function run(command, environment) {
  const [program = '', ...parameters] = command
  const outcome = await runToEnd(packageProgram(program), parameters, {
    cwd: rootFolder,
    env: environment,
    show: true,
    limitMilliseconds: LIMIT_MILLISECONDS,
  })
  if (outcome.output) console.log(outcome.output)
  return outcome.code
}

/** @returns {Promise<import('./counting.mjs').Count>} */
async function buildStage() {
  try {
    console.log(await ensureBuild(rootFolder))
    return { passed: 0, failed: 0, skipped: 0, notes: [] }
  } catch (error) {
    console.error(failureText(error))
    return { passed: 0, failed: 1, skipped: 0, notes: ['the build failed'] }
  }
}

/** @param {string} file */
async function readReport(file) {
  try {
    return JSON.parse(await readFile(file, 'utf8'))
  } catch {
    return undefined
  }
}
