import { notFound } from '~~/server/http/appError'
import { deleteRun, findRun } from '~~/server/repositories/runs'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { requireChannel } from '../channels/requireChannel'
import { runSubject } from './runSubject'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'

/** Removes the wiring run of a channel, and with it what the channel should read. */
export function removeRun(scope: AircraftScope, channelId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    const run = await findRun(tx, aircraftId, channelId)
    if (!run) throw notFound('wiring run')
    await requireVersion(tx, scope, runSubject(channel), run, version)
    await deleteRun(tx, aircraftId, run.id)
    await rewriteReadings(tx, aircraftId, [channelId])
    await recordWrite(tx, scope, {
      action: 'run.removed',
      entityId: channelId,
      before: run,
      after: null,
    })
  })
}
