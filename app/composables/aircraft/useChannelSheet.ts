import { toOperatingConditions, toThermocoupleRun, zoneKey } from '#shared/domain/channelRun'
import type { ChannelSheet } from '#shared/types/workbook'
import { useAircraft } from '~/composables/aircraft/useAircraft'
import { useApiData } from '~/composables/api/useApiData'

/** One channel with everything its pages show, loaded in one call. */
export async function useChannelSheet() {
  const { api, path, can } = useAircraft()
  const route = useRoute()
  const channelId = String(route.params.channelId)
  const channelApi = `${api.value}/channels/${channelId}`
  const { data: sheet, refresh } = await useApiData<ChannelSheet>(`channel-${channelId}`, () => channelApi)

  const run = computed(() => toThermocoupleRun(sheet.value.channel, sheet.value.display, sheet.value.run))
  const states = computed(() => toOperatingConditions(sheet.value.grid))
  const zones = computed(() =>
    Object.fromEntries(sheet.value.grid.zones.map(({ id, name, kind }) => [zoneKey(id), { name, kind }])),
  )
  const lengths = computed(() =>
    Object.fromEntries((sheet.value.run?.sections ?? []).map(({ id, lengthMetres }) => [id, lengthMetres])),
  )
  return {
    sheet,
    refresh,
    run,
    states,
    zones,
    lengths,
    can,
    channelApi,
    aircraftPath: path,
    aircraftApi: api,
    channelPath: computed(() => `${path.value}/channels/${channelId}`),
  }
}
