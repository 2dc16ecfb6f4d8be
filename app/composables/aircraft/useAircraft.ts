import type { InjectionKey } from 'vue'
import type { Permission } from '#shared/domain/permissions'
import { may } from '#shared/domain/permissions'
import type { AircraftSheet } from '#shared/types/workbook'

export interface AircraftContext {
  sheet: Ref<AircraftSheet>
  refresh: () => Promise<void>
}

const KEY: InjectionKey<AircraftContext> = Symbol('aircraft')

export function provideAircraft(context: AircraftContext): void {
  provide(KEY, context)
}

/** The aircraft whose pages are open, and what this person may do on it. Nothing is written while archived. */
export function useAircraft() {
  const context = inject(KEY)
  if (!context) throw new Error('useAircraft needs the pages of one aircraft around it')
  const { sheet, refresh } = context
  const path = computed(() => `/aircraft/${sheet.value.aircraft.id}`)
  const api = computed(() => `/api${path.value}`)
  const archived = computed(() => sheet.value.aircraft.archivedAt !== null)
  const can = (permission: Permission) => !archived.value && may(sheet.value.roles, permission)
  return { sheet, refresh, path, api, archived, can }
}
