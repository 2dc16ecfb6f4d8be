import type { Problem } from '#shared/types/problem'
import type { SaveRunInput } from '#shared/schemas/run'
import { saveRunSchema } from '#shared/schemas/run'
import type { WiringRun } from '#shared/types/workbook'
import { useRunEditorStore } from '~/stores/runEditor'
import { problemOf, useApi } from '~/composables/api/useApi'

/** Saves the run being edited; a stale save is refused with what changed, and nothing of either side is lost. */
export function useRunSave(path: string) {
  const api = useApi()
  const editor = useRunEditorStore()
  const saving = ref(false)
  const problem = shallowRef<Problem | null>(null)

  function refuseLocally(input: SaveRunInput): boolean {
    const parsed = saveRunSchema.safeParse(input)
    if (parsed.success) return false
    problem.value = {
      type: 'about:blank',
      title: 'The run is not complete',
      status: 422,
      detail: parsed.error.issues.map(({ message }) => message).join(' '),
      code: 'invalid-input',
    }
    return true
  }

  async function save(): Promise<void> {
    if (saving.value || !editor.parts) return
    problem.value = null
    const run = editor.parts
    const input = { version: editor.version, run }
    if (refuseLocally(input)) return
    saving.value = true
    try {
      const answer = await api.put<{ run: WiringRun }>(path, input)
      editor.markSaved(run, answer.run.version)
    } catch (error) {
      problem.value = problemOf(error)
    }
    saving.value = false
  }

  /** After a refusal for staleness: writes mine as the next version of what is stored now. */
  async function saveOver(): Promise<void> {
    const current = problem.value?.changed?.version
    if (current === undefined || !editor.parts) return
    editor.version = current
    await save()
  }

  const state = computed(() => {
    if (saving.value) return 'saving' as const
    if (problem.value) return 'failed' as const
    return editor.changed ? ('changed' as const) : ('saved' as const)
  })

  return { save, saveOver, problem, state, saving }
}
