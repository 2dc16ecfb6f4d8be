import type { PageQuery } from '#shared/schemas/paging'
import type { ChannelTable } from '#shared/types/workbook'
import { inTransaction } from '~~/server/db/client'
import { countChannels, pageOfChannels } from '~~/server/repositories/channels'
import { listDisplays } from '~~/server/repositories/displays'
import { listReadings } from '~~/server/repositories/expectedReadings'
import { groupBy } from '~~/server/db/groupBy'
import { listStates } from '~~/server/repositories/operatingStates'
import { channelsWithProbe } from '~~/server/repositories/probes'
import { channelsWithRun } from '~~/server/repositories/runs'
import { toChannelRow } from './channelRow'

/** One page of the channel table, in a number of queries that does not grow with the channels. */
export function showChannels(aircraftId: number, { page, pageSize }: PageQuery): Promise<ChannelTable> {
  return inTransaction(async (tx) => {
    const states = await listStates(tx, aircraftId)
    const total = await countChannels(tx, aircraftId)
    const channels = await pageOfChannels(tx, aircraftId, { page, pageSize })
    const ids = channels.map((channel) => channel.id)
    const readings = groupBy(await listReadings(tx, aircraftId, ids), (reading) => reading.channelId)
    const displays = new Map((await listDisplays(tx, aircraftId)).map(({ id, name }) => [id, name]))
    const withProbe = await channelsWithProbe(tx, aircraftId)
    const withRun = await channelsWithRun(tx, aircraftId)
    const items = channels.map((channel) =>
      toChannelRow({
        channel,
        displayName: (channel.displayId !== null && displays.get(channel.displayId)) || null,
        hasProbe: withProbe.has(channel.id),
        hasRun: withRun.has(channel.id),
        readings: readings.get(channel.id) ?? [],
      }),
    )
    return { states, rows: { items, total, page, pageSize } }
  })
}
