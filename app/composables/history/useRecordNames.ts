import type { ChannelTable, Display, ZoneGrid } from '#shared/types/workbook'
import { useApiData } from '~/composables/api/useApiData'
import type { RecordNames } from '~/composables/history/eventWords'

/** What the records of an aircraft are called, for a history that knows their keys alone. */
export async function useRecordNames(aircraftId: number) {
  const api = `/api/aircraft/${aircraftId}`
  const [{ data: grid }, { data: list }, { data: table }] = await Promise.all([
    useApiData<ZoneGrid>(`zones-${aircraftId}`, () => `${api}/zones`),
    useApiData<{ displays: Display[] }>(`displays-${aircraftId}`, () => `${api}/displays`),
    useApiData<ChannelTable>(`channel-names-${aircraftId}`, () => `${api}/channels?pageSize=200`),
  ])
  return computed<RecordNames>(() => ({
    channels: new Map(table.value.rows.items.map(({ channel }) => [channel.id, channel.tag])),
    zones: new Map(grid.value.zones.map(({ id, name }) => [id, name])),
    states: new Map(grid.value.states.map(({ id, name }) => [id, name])),
    displays: new Map(list.value.displays.map(({ id, name }) => [id, name])),
  }))
}
