import type { OperatingConditions, RunStatesSolution, ThermocoupleRun } from '#shared/thermometry/run'
import { emfPath, RunInputError, solveRunOverStates } from '#shared/thermometry/run'

interface Circuit {
  run: ThermocoupleRun
  states: readonly OperatingConditions[]
}

/** An error smaller than any display shows, kelvin. */
const NEGLIGIBLE_KELVIN = 0.05

/** The state worth looking at first: the worst, or where nothing is wrong the one with the most emf. */
function telling({ states, worst }: RunStatesSolution): string {
  if (worst && (worst.errorKelvin === null || Math.abs(worst.errorKelvin) >= NEGLIGIBLE_KELVIN))
    return worst.id
  const emf = (index: number) => Math.abs(states[index]?.solution.terminalMillivolts ?? 0)
  const most = states.reduce((best, _, index) => (emf(index) > emf(best) ? index : best), 0)
  return states[most]?.id ?? ''
}

/** A run solved over its operating states by the shared physics, and the one state that is looked at. */
export function useSolvedRun(source: () => Circuit | null) {
  const chosen = ref<string | null>(null)

  const outcome = computed(() => {
    const circuit = source()
    if (!circuit) return { solved: null, refusal: '' }
    try {
      return { solved: solveRunOverStates(circuit.run, circuit.states), refusal: '' }
    } catch (error) {
      if (error instanceof RunInputError) return { solved: null, refusal: error.message }
      throw error
    }
  })
  const solved = computed(() => outcome.value.solved)

  const stateId = computed({
    get: () => chosen.value ?? (solved.value ? telling(solved.value) : ''),
    set: (id: string) => {
      chosen.value = id
    },
  })
  const conditions = computed(() => source()?.states.find(({ id }) => id === stateId.value) ?? null)
  const solution = computed(
    () => solved.value?.states.find(({ id }) => id === stateId.value)?.solution ?? null,
  )
  const path = computed(() => {
    const circuit = source()
    return circuit && conditions.value && solution.value ? emfPath(circuit.run, conditions.value) : null
  })

  return { solved, refusal: computed(() => outcome.value.refusal), stateId, conditions, solution, path }
}
