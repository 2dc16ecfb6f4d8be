import { useSolvedRun } from '~/composables/run/useSolvedRun'
import { useRunEditorStore } from '~/stores/runEditor'
import { useUnitsStore } from '~/stores/units'

/** The reading of the run being edited in one state, in words. */
export function useEditedReading(stateId: () => string) {
  const editor = useRunEditorStore()
  const units = useUnitsStore()
  const { solved, refusal } = useSolvedRun(() =>
    editor.run && editor.surroundings ? { run: editor.run, states: editor.surroundings.states } : null,
  )
  return computed(() => {
    const state = solved.value?.states.find(({ id }) => id === stateId())
    if (!state) return refusal.value
    const { indication, errorKelvin } = state.solution
    if (indication.kind === 'value')
      return `${state.name}: shows ${units.temperatureText(indication.celsius)}, error ${units.differenceText(errorKelvin ?? 0)}`
    return `${state.name}: ${indication.kind === 'withheld' ? 'no figure' : indication.kind.replaceAll('-', ' ')}`
  })
}
