import type { LogProbeInput } from '#shared/schemas/probe'
import type { Channel, Probe } from '#shared/types/workbook'
import { invalidField, notFound } from '~~/server/http/appError'
import { findProbe, insertProbe, updateProbe } from '~~/server/repositories/probes'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { requireChannel } from '../channels/requireChannel'
import { firstVersion } from '../firstVersion'
import { probeSubject } from './probeSubject'

type ProbeFields = Omit<LogProbeInput, 'version'>

function checkType({ sensor }: Channel, { thermocoupleType }: ProbeFields): void {
  if (sensor === 'thermocouple' && thermocoupleType === null)
    throw invalidField('thermocoupleType', 'Choose the type marked on the probe.')
  if (sensor !== 'thermocouple' && thermocoupleType !== null)
    throw invalidField('thermocoupleType', 'Only a thermocouple channel has a thermocouple type.')
}

/** Logs the probe fitted to a channel, in place of the one that was logged before. */
export function logProbe(
  scope: AircraftScope,
  channelId: number,
  { version, ...fields }: LogProbeInput,
): Promise<{ probe: Probe }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    checkType(channel, fields)
    const before = await findProbe(tx, aircraftId, channelId)
    await requireVersion(tx, scope, probeSubject(channel), before, version)
    if (before) await updateProbe(tx, aircraftId, before, fields)
    else {
      const first = await firstVersion(tx, aircraftId, 'probe', channelId)
      await insertProbe(tx, aircraftId, channelId, { ...fields, version: first })
    }
    const probe = await findProbe(tx, aircraftId, channelId)
    if (!probe) throw notFound('probe')
    await recordWrite(tx, scope, {
      action: 'probe.logged',
      entityId: channelId,
      before,
      after: probe,
    })
    return { probe }
  })
}
