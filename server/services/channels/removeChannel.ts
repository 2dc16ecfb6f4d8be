import { deleteChannel } from '~~/server/repositories/channels'
import { findProbe } from '~~/server/repositories/probes'
import { findRun } from '~~/server/repositories/runs'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { channelSubject, requireChannel } from './requireChannel'

/** Removes a channel with its probe, run and readings. History keeps what they were. */
export function removeChannel(scope: AircraftScope, channelId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    await requireVersion(tx, scope, channelSubject(channel), channel, version)
    const probe = await findProbe(tx, aircraftId, channelId)
    const run = await findRun(tx, aircraftId, channelId)
    await deleteChannel(tx, aircraftId, channelId)
    await recordWrite(tx, scope, {
      action: 'channel.deleted',
      entityId: channelId,
      before: { ...channel, probe, run },
      after: null,
    })
  })
}
