import type { Transaction } from '~~/server/db/client'
import { listChannels } from '~~/server/repositories/channels'
import { listDisplays } from '~~/server/repositories/displays'
import { replaceReadings } from '~~/server/repositories/expectedReadings'
import { listRuns } from '~~/server/repositories/runs'
import { loadGrid } from '../zones/loadGrid'
import type { ChannelRecords } from './solveReadings'
import { solveReadings } from './solveReadings'

/**
 * Solves channels anew and stores what they should read, in the transaction of the write that moves them: nobody
 * sees a reading that does not belong to the records beside it. The number of queries does not grow with the channels.
 *
 * @param only the channels that can have moved; every one of the aircraft unless given
 */
export async function rewriteReadings(
  tx: Transaction,
  aircraftId: number,
  only?: readonly number[],
): Promise<void> {
  const grid = await loadGrid(tx, aircraftId)
  const all = await loadChannelRecords(tx, aircraftId)
  const records = only ? all.filter(({ channel }) => only.includes(channel.id)) : all
  const readings = records.flatMap((record) => solveReadings(record, grid))
  await replaceReadings(
    tx,
    aircraftId,
    records.map(({ channel }) => channel.id),
    readings,
  )
}

async function loadChannelRecords(tx: Transaction, aircraftId: number): Promise<ChannelRecords[]> {
  const channels = await listChannels(tx, aircraftId)
  const displays = new Map((await listDisplays(tx, aircraftId)).map((display) => [display.id, display]))
  const runs = new Map((await listRuns(tx, aircraftId)).map((run) => [run.channelId, run]))
  return channels.map((channel) => ({
    channel,
    display: (channel.displayId !== null && displays.get(channel.displayId)) || null,
    run: runs.get(channel.id) ?? null,
  }))
}
