import { solveRunOverStates } from '#shared/thermometry'
import type { RunSolution, RunStatesSolution } from '#shared/thermometry'
import type { RunFixture } from '../../fixtures/runs'

/** A fixture solved in all its states, with the answer of one of them. */
export function solved(
  fixture: RunFixture,
  stateIndex = 0,
): {
  fixture: RunFixture
  states: RunStatesSolution
  solution: RunSolution
} {
  const states = solveRunOverStates(fixture.run, fixture.states)
  const state = states.states[stateIndex]
  if (!state) throw new Error(`The fixture has no state ${stateIndex}.`)
  return { fixture, states, solution: state.solution }
}

/** Text with its no-break spaces made ordinary and its gaps closed. */
export function plain(text: string): string {
  return text.replace(/\s+/g, ' ').trim()
}
