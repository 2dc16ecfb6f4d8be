import { Failure } from '../failure.mjs'

/**
 * @typedef {object} Stage
 * @property {string} name
 * @property {'verdict' | 'vitest' | 'playwright' | 'build'} kind
 * @property {string[]} [command] for a verdict: the program and its parameters
 * @property {'database'} [needs]
 */

/** The longest of the checks on the sources first, for the others run beside it. @type {Stage[]} */
export const STAGES = [
  { name: 'typecheck', kind: 'verdict', command: ['nuxt', 'typecheck'] },
  { name: 'lint', kind: 'verdict', command: ['eslint', '.', '--max-warnings', '0'] },
  { name: 'format', kind: 'verdict', command: ['prettier', '--check', '.'] },
  { name: 'knip', kind: 'verdict', command: ['knip'] },
  { name: 'unit', kind: 'vitest' },
  { name: 'architecture', kind: 'vitest' },
  { name: 'reference', kind: 'vitest' },
  { name: 'nuxt', kind: 'vitest' },
  { name: 'build', kind: 'build' },
  { name: 'integration', kind: 'vitest', needs: 'database' },
  { name: 'e2e', kind: 'playwright', needs: 'database' },
]

/**
 * What to run, from the command line: `--only unit,e2e`, and after `--` whatever the runners should get besides.
 * @param {string[]} parameters
 * @returns {{ stages: Stage[], passedOn: string[] }}
 */
export function chooseStages(parameters) {
  const divide = parameters.indexOf('--')
  const own = divide < 0 ? parameters : parameters.slice(0, divide)
  const passedOn = divide < 0 ? [] : parameters.slice(divide + 1)
  if (own.length === 0) return { stages: STAGES, passedOn }
  const [option, names, ...rest] = own
  if (option !== '--only' || names === undefined || rest.length > 0) throw usage(own.join(' '))
  const wanted = new Set(names.split(',').map((name) => name.trim()))
  for (const name of wanted) if (!STAGES.some((stage) => stage.name === name)) throw usage(name)
  const needsBuild = STAGES.some(({ name, needs }) => wanted.has(name) && needs === 'database')
  if (needsBuild) wanted.add('build')
  return { stages: STAGES.filter(({ name }) => wanted.has(name)), passedOn }
}

/** @param {string} given */
function usage(given) {
  return new Failure(`"${given}" is not understood.`, {
    todo: `node scripts/test.mjs --only ${STAGES.map(({ name }) => name).join(',')} -- more for the runners`,
  })
}
