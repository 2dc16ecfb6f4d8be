import type { ZoneGrid, ZoneTemperature } from '#shared/types/workbook'
import { useRunEditorStore } from '~/stores/runEditor'
import { problemOf, useApi } from '~/composables/api/useApi'

/** How long a figure must rest before it is stored, so that typing 120 does not store 1 and 12 on the way. */
const REST_MILLISECONDS = 600

/**
 * Zone temperatures changed while a run is edited: shown at once, stored as records of their own. A stale one is
 * refused and the stored figure put back, since it moves other channels too.
 */
export function useZoneTemperatureSave(aircraftApi: string, grid: () => ZoneGrid) {
  const api = useApi()
  const editor = useRunEditorStore()
  const failure = ref('')
  const latest = new Map<string, ZoneTemperature>()
  const waiting = new Map<string, ReturnType<typeof setTimeout>>()

  const key = (stateId: string, zone: string) => `${stateId}-${zone}`
  const storedCell = (stateId: string, zone: string) =>
    latest.get(key(stateId, zone)) ??
    grid().temperatures.find((cell) => String(cell.stateId) === stateId && String(cell.zoneId) === zone)

  async function store(stateId: string, zone: string, celsius: number): Promise<void> {
    const cell = storedCell(stateId, zone)
    if (!cell) return
    failure.value = ''
    try {
      const answer = await api.put<{ temperature: ZoneTemperature }>(
        `${aircraftApi}/states/${stateId}/temperatures/${zone}`,
        { version: cell.version, celsius },
      )
      latest.set(key(stateId, zone), answer.temperature)
    } catch (error) {
      const problem = problemOf(error)
      const current = problem.changed?.fields.find(({ field }) => field === 'celsius')?.current
      const stands = typeof current === 'number' ? current : cell.celsius
      latest.set(key(stateId, zone), {
        ...cell,
        celsius: stands,
        version: problem.changed?.version ?? cell.version,
      })
      editor.setZoneCelsius(stateId, zone, stands)
      failure.value = problem.detail
    }
  }

  function save(stateId: string, zone: string, celsius: number): void {
    editor.setZoneCelsius(stateId, zone, celsius)
    clearTimeout(waiting.get(key(stateId, zone)))
    waiting.set(
      key(stateId, zone),
      setTimeout(() => void store(stateId, zone, celsius), REST_MILLISECONDS),
    )
  }

  return { save, failure }
}
