import type { OperatingConditions, ThermocoupleRun } from '#shared/thermometry/run'
import { emfPath, RunInputError, solveRunOverStates } from '#shared/thermometry/run'

interface Circuit {
  run: ThermocoupleRun
  states: readonly OperatingConditions[]
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

  /** The state looked at: the chosen one, else the worst. */
  const stateId = computed({
    get: () => chosen.value ?? solved.value?.worst?.id ?? '',
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
