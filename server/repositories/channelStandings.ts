import { inArray } from 'drizzle-orm'
import type { FindingCode } from '#shared/thermometry/run'
import type { Channel } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { channels, expectedReadings, probes, wiringRuns } from '~~/server/db/schema'
import { groupBy } from '~~/server/db/groupBy'

/** What decides where a channel stands, without everything else there is to it. */
export interface StandingRecords {
  aircraftId: number
  channel: Pick<Channel, 'id' | 'sensor' | 'displayId'>
  hasProbe: boolean
  hasRun: boolean
  readings: { findingCodes: FindingCode[] }[]
}

/** The records that decide where channels stand, in four queries however many aircraft there are. */
export async function listStandingRecords(
  executor: Executor,
  aircraftIds: readonly number[],
): Promise<StandingRecords[]> {
  if (aircraftIds.length === 0) return []
  const ids = [...aircraftIds]
  const found = await executor
    .select({
      id: channels.id,
      aircraftId: channels.aircraftId,
      sensor: channels.sensor,
      displayId: channels.displayId,
    })
    .from(channels)
    .where(inArray(channels.aircraftId, ids))
  const probed = await executor
    .select({ channelId: probes.channelId })
    .from(probes)
    .where(inArray(probes.aircraftId, ids))
  const wired = await executor
    .select({ channelId: wiringRuns.channelId })
    .from(wiringRuns)
    .where(inArray(wiringRuns.aircraftId, ids))
  const readings = await executor
    .select({ channelId: expectedReadings.channelId, findingCodes: expectedReadings.findingCodes })
    .from(expectedReadings)
    .where(inArray(expectedReadings.aircraftId, ids))
  const withProbe = new Set(probed.map((row) => row.channelId))
  const withRun = new Set(wired.map((row) => row.channelId))
  const byChannel = groupBy(readings, (reading) => reading.channelId)
  return found.map(({ aircraftId, ...channel }) => ({
    aircraftId,
    channel,
    hasProbe: withProbe.has(channel.id),
    hasRun: withRun.has(channel.id),
    readings: byChannel.get(channel.id) ?? [],
  }))
}
