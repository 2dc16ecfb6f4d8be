import type { Versioned } from '#shared/types/workbook'
import { problemOf, useApi } from '~/composables/api/useApi'

/** Renaming and removing the records of a list, each write carrying the version it was based on. */
export function useRecordActions(path: string, changed: () => void) {
  const api = useApi()
  const failure = ref('')

  async function attempt(action: () => Promise<unknown>): Promise<void> {
    failure.value = ''
    try {
      await action()
    } catch (error) {
      failure.value = problemOf(error).detail
    }
    changed()
  }

  return {
    failure,
    rename: (record: Versioned, fields: object) =>
      attempt(() => api.patch(`${path}/${record.id}`, { ...fields, version: record.version })),
    remove: (record: Versioned) =>
      attempt(() => api.remove(`${path}/${record.id}?version=${record.version}`)),
  }
}
