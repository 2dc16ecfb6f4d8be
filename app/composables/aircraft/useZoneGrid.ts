import type { Problem } from '#shared/types/problem'
import type { ZoneGrid, ZoneTemperature } from '#shared/types/workbook'
import { ApiFailure, useApi } from '~/composables/api/useApi'

export interface MovedChannel {
  channelId: number
  tag: string
  beforeCelsius: number | null
  afterCelsius: number | null
}

export interface CellState {
  state: 'unchanged' | 'saving' | 'saved' | 'failed'
  problem: Problem | null
  /** What the person wants stored where somebody else was faster. */
  mine: number | null
}

const IDLE: CellState = { state: 'unchanged', problem: null, mine: null }

/** Editing the zone temperatures of an aircraft, one cell at a time; a stale cell shows both values. */
export function useZoneGrid(grid: Ref<ZoneGrid>, apiPath: string) {
  const api = useApi()
  const cells = reactive(new Map<string, CellState>())
  const moved = shallowRef<{ zone: string; channels: MovedChannel[] } | null>(null)

  const key = (stateId: number, zoneId: number) => `${stateId}-${zoneId}`
  const cellState = (stateId: number, zoneId: number) => cells.get(key(stateId, zoneId)) ?? IDLE

  const byKey = computed(
    () => new Map(grid.value.temperatures.map((cell) => [key(cell.stateId, cell.zoneId), cell])),
  )
  const temperatureOf = (stateId: number, zoneId: number) => byKey.value.get(key(stateId, zoneId))

  function replace(stored: ZoneTemperature): void {
    const same = (cell: ZoneTemperature) => cell.stateId === stored.stateId && cell.zoneId === stored.zoneId
    const temperatures = grid.value.temperatures.map((cell) => (same(cell) ? stored : cell))
    grid.value = { ...grid.value, temperatures }
  }

  async function save(cell: ZoneTemperature, celsius: number): Promise<void> {
    const at = key(cell.stateId, cell.zoneId)
    cells.set(at, { state: 'saving', problem: null, mine: celsius })
    try {
      const answer = await api.put<{ temperature: ZoneTemperature; moved: MovedChannel[] }>(
        `${apiPath}/states/${cell.stateId}/temperatures/${cell.zoneId}`,
        { version: cell.version, celsius },
      )
      replace(answer.temperature)
      cells.set(at, { state: 'saved', problem: null, mine: null })
      moved.value = {
        zone: grid.value.zones.find(({ id }) => id === cell.zoneId)?.name ?? '',
        channels: answer.moved,
      }
    } catch (error) {
      if (!(error instanceof ApiFailure)) throw error
      cells.set(at, { state: 'failed', problem: error.problem, mine: celsius })
    }
  }

  /** Settles a stale cell: the stored value is shown, and mine is written on top of it when asked for. */
  async function settle(cell: ZoneTemperature, keepMine: boolean): Promise<void> {
    const { problem, mine } = cellState(cell.stateId, cell.zoneId)
    const changed = problem?.changed
    if (!changed) return
    const current = changed.fields.find(({ field }) => field === 'celsius')?.current
    const stored = {
      ...cell,
      version: changed.version,
      celsius: typeof current === 'number' ? current : cell.celsius,
    }
    replace(stored)
    cells.delete(key(cell.stateId, cell.zoneId))
    if (keepMine && mine !== null) await save(stored, mine)
  }

  return { cellState, temperatureOf, moved, save, settle }
}
