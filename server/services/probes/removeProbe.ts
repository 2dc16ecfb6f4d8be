import { notFound } from '~~/server/http/appError'
import { deleteProbe, findProbe } from '~~/server/repositories/probes'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { requireChannel } from '../channels/requireChannel'
import { probeSubject } from './probeSubject'

/** Removes the probe of a channel. What the channel should read rests on the run, so no reading moves. */
export function removeProbe(scope: AircraftScope, channelId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    const probe = await findProbe(tx, aircraftId, channelId)
    if (!probe) throw notFound('probe')
    await requireVersion(tx, scope, probeSubject(channel), probe, version)
    await deleteProbe(tx, aircraftId, probe.id)
    await recordWrite(tx, scope, {
      action: 'probe.removed',
      entityId: channelId,
      before: probe,
      after: null,
    })
  })
}
