import type { BenchRunInput } from '#shared/schemas/bench'
import type { RunSolution, RunStatesSolution } from '#shared/thermometry'
import { solveRun, solveRunOverStates } from '#shared/thermometry'

/** The run solver's answer: for one set of conditions, or over operating states with the worst of them. */
export async function answerRun({
  run,
  conditions,
  states,
}: BenchRunInput): Promise<RunSolution | RunStatesSolution> {
  return conditions ? solveRun(run, conditions) : solveRunOverStates(run, states ?? [])
}
