import { defineStore } from 'pinia'
import type { DraftZone } from '#shared/domain/runDraft'
import type { WiringRunInput } from '#shared/schemas/run'
import type { LetterType } from '#shared/thermometry'
import type { DisplayInput, OperatingConditions, ThermocoupleRun } from '#shared/thermometry/run'

/** What surrounds the run being edited and is not part of it. */
export interface RunSurroundings {
  type: LetterType
  tipZone: string
  terminalZone: string
  display: DisplayInput
  displayName: string
  zones: readonly DraftZone[]
  states: readonly OperatingConditions[]
}

/** Steps of undo that are kept. */
const MAX_HISTORY = 200

/** The run being edited: the draft beside what is stored, undo and redo, zone temperatures. */
export const useRunEditorStore = defineStore('run-editor', () => {
  const surroundings = shallowRef<RunSurroundings | null>(null)
  const parts = shallowRef<WiringRunInput | null>(null)
  const stored = shallowRef<WiringRunInput | null>(null)
  const version = ref<number | null>(null)
  const past = shallowRef<readonly WiringRunInput[]>([])
  const future = shallowRef<readonly WiringRunInput[]>([])
  const selected = ref<string | null>(null)

  /** Starts over with a run; `storedVersion` is null for one that was never saved. */
  function open(around: RunSurroundings, run: WiringRunInput, storedVersion: number | null): void {
    surroundings.value = around
    parts.value = run
    stored.value = storedVersion === null ? null : run
    version.value = storedVersion
    past.value = []
    future.value = []
    selected.value = null
  }

  function change(next: WiringRunInput): void {
    if (!parts.value || next === parts.value) return
    past.value = [...past.value, parts.value].slice(-MAX_HISTORY)
    future.value = []
    parts.value = next
  }

  function undo(): void {
    const last = past.value.at(-1)
    if (!last || !parts.value) return
    future.value = [parts.value, ...future.value]
    past.value = past.value.slice(0, -1)
    parts.value = last
  }

  function redo(): void {
    const [next, ...rest] = future.value
    if (!next || !parts.value) return
    past.value = [...past.value, parts.value]
    future.value = rest
    parts.value = next
  }

  /** What was just saved under a version; edits made while it was under way stay edits. */
  function markSaved(run: WiringRunInput, savedVersion: number): void {
    stored.value = run
    version.value = savedVersion
  }

  function surround(changes: Partial<RunSurroundings>): void {
    if (surroundings.value) surroundings.value = { ...surroundings.value, ...changes }
  }

  function setZoneCelsius(stateId: string, zone: string, celsius: number): void {
    const states = (surroundings.value?.states ?? []).map((state) =>
      state.id === stateId ? { ...state, zoneCelsius: { ...state.zoneCelsius, [zone]: celsius } } : state,
    )
    surround({ states })
  }

  const run = computed<ThermocoupleRun | null>(() => {
    const around = surroundings.value
    if (!around || !parts.value) return null
    return {
      type: around.type,
      tipZone: around.tipZone,
      sections: parts.value.sections,
      joints: parts.value.joints,
      terminals: { ...parts.value.terminals, zone: around.terminalZone },
      display: around.display,
    }
  })

  const changed = computed(() => parts.value !== stored.value)
  /** A proposed run that nobody touched can be proposed again; anything drawn since would be lost. */
  const unsaved = computed(() => changed.value && (version.value !== null || past.value.length > 0))

  return {
    surroundings,
    parts,
    version,
    selected,
    run,
    changed,
    unsaved,
    canUndo: computed(() => past.value.length > 0),
    canRedo: computed(() => future.value.length > 0),
    open,
    change,
    undo,
    redo,
    markSaved,
    surround,
    setZoneCelsius,
  }
})
