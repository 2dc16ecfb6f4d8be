import type { Role } from '#shared/domain/permissions'
import type { Channel, ChannelSheet } from '#shared/types/workbook'
import { inTransaction } from '~~/server/db/client'
import { listChannels } from '~~/server/repositories/channels'
import { listReadings } from '~~/server/repositories/expectedReadings'
import { findDisplay } from '~~/server/repositories/displays'
import { findProbe } from '~~/server/repositories/probes'
import { findRun } from '~~/server/repositories/runs'
import { requireAircraft } from '../aircraft/requireAircraft'
import { loadGrid } from '../zones/loadGrid'
import { standingOf } from './channelRow'
import { requireChannel } from './requireChannel'

function neighbour(channel: Channel | undefined): { id: number; tag: string } | null {
  return channel ? { id: channel.id, tag: channel.tag } : null
}

/** Everything the channel sheet and the run editor need, read at one moment. */
export function showChannel(
  { aircraftId, roles }: { aircraftId: number; roles: Role[] },
  channelId: number,
): Promise<ChannelSheet> {
  return inTransaction(async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    const probe = await findProbe(tx, aircraftId, channelId)
    const run = await findRun(tx, aircraftId, channelId)
    const readings = await listReadings(tx, aircraftId, [channelId])
    const { displayId } = channel
    const display = displayId === null ? null : ((await findDisplay(tx, aircraftId, displayId)) ?? null)
    const inOrder = await listChannels(tx, aircraftId)
    const at = inOrder.findIndex((one) => one.id === channelId)
    return {
      aircraft: await requireAircraft(tx, aircraftId),
      roles,
      channel,
      probe,
      run,
      display,
      grid: await loadGrid(tx, aircraftId),
      readings,
      standing: standingOf({ channel, hasProbe: probe !== null, hasRun: run !== null, readings }),
      previous: neighbour(inOrder[at - 1]),
      next: neighbour(inOrder[at + 1]),
    }
  })
}
