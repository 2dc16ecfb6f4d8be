import { solveRun } from './solveRun'
import type { OperatingConditions, RunSolution, RunStatesSolution, ThermocoupleRun } from './types'

/** How bad an answer is: no answer is worst, then off scale, then the size of the error. */
function badness({ indication, errorKelvin }: RunSolution): readonly [number, number] {
  if (indication.kind === 'withheld') return [2, 0]
  if (errorKelvin === null) return [1, 0]
  return [0, Math.abs(errorKelvin)]
}

function worseThan(a: RunSolution, b: RunSolution): boolean {
  const [classA, sizeA] = badness(a)
  const [classB, sizeB] = badness(b)
  return classA === classB ? sizeA > sizeB : classA > classB
}

/**
 * Solves a run in every operating state and names the worst.
 *
 * @param states zone temperatures of each state, °C
 * @throws RunInputError as `solveRun`
 */
export function solveRunOverStates(
  run: ThermocoupleRun,
  states: readonly OperatingConditions[],
): RunStatesSolution {
  const solved = states.map((state) => ({ id: state.id, name: state.name, solution: solveRun(run, state) }))
  const [first, ...others] = solved
  if (!first) return { states: [], worst: null }
  const worst = others.reduce((bad, next) => (worseThan(next.solution, bad.solution) ? next : bad), first)
  const { indication, errorKelvin } = worst.solution
  return { states: solved, worst: { id: worst.id, name: worst.name, indication, errorKelvin } }
}
