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
/** @typedef {import('./summary.mjs').StageResult} StageResult */
/** @typedef {{ environment: NodeJS.ProcessEnv, passedOn: string[] }} Surroundings */

/**
 * Runs the stages that only look at the sources, two at a time: each of them leaves a core idle by itself. What one
 * prints is shown when it is done, so that the two do not mix.
 * @param {Stage[]} stages
 * @param {Surroundings} surroundings
 * @returns {Promise<StageResult[]>}
 */
export async function runVerdicts(stages, surroundings) {
  const waiting = [...stages.entries()]
  /** @type {StageResult[]} */
  const results = []
  const work = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) {
      results[next[0]] = await runVerdict(next[1], surroundings)
    }
  }
  await Promise.all([work(), work()])
  return results
}

/** @param {Stage} stage @param {Surroundings} surroundings */
async function runVerdict(stage, { environment }) {
  const begin = Date.now()
  const { code, output } = await run(stage.command ?? [], environment, false)
  printHeading(stage)
  console.log(output.trimEnd())
  return ending(stage, countVerdict(code), begin)
}

/**
 * Runs one stage to its end, showing what it prints as it comes.
 * @param {Stage} stage
 * @param {Surroundings} surroundings
 * @returns {Promise<StageResult>}
 */
export async function runStage(stage, surroundings) {
  const begin = Date.now()
  printHeading(stage)
  return ending(stage, await countOf(stage, surroundings), begin)
}

/** @param {Stage} stage */
function printHeading({ name }) {
  console.log(`\n── ${name} ${'─'.repeat(Math.max(0, 70 - name.length))}`)
}

/** @param {Stage} stage @param {import('./counting.mjs').Count} count @param {number} begin */
function ending({ name }, count, begin) {
  const milliseconds = Date.now() - begin
  console.log(`── ${name}: ${count.passed} passed, ${count.failed} failed, ${elapsedText(milliseconds)}`)
  return { ...count, name, milliseconds }
}

/**
 * @param {Stage} stage
 * @param {Surroundings} surroundings
 * @returns {Promise<import('./counting.mjs').Count>}
 */
async function countOf(stage, surroundings) {
  if (stage.kind === 'build') return buildStage()
  const reportFile = path.join(REPORT_FOLDER, `${stage.name}.json`)
  await mkdir(REPORT_FOLDER, { recursive: true })
  await rm(reportFile, { force: true })
  const isVitest = stage.kind === 'vitest'
  const command = isVitest ? vitestCommand(stage.name, reportFile) : ['playwright', 'test']
  const environment = { ...surroundings.environment, PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile }
  const { code: exitCode } = await run([...command, ...surroundings.passedOn], environment, true)
  const report = await readReport(reportFile)
  return isVitest ? countVitest(report, exitCode) : countPlaywright(report, exitCode)
}

/** @param {string} project @param {string} reportFile */
function vitestCommand(project, reportFile) {
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`]
  return ['vitest', 'run', '--project', project, ...reporters]
}

/** @param {string[]} command @param {NodeJS.ProcessEnv} environment @param {boolean} show */
async function run(command, environment, show) {
  const [program = '', ...parameters] = command
  const outcome = await runToEnd(packageProgram(program), parameters, {
    cwd: rootFolder,
    env: environment,
    show,
    limitMilliseconds: LIMIT_MILLISECONDS,
  })
  if (show && outcome.output) console.log(outcome.output)
  return outcome
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
