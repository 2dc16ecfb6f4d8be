import type { SaveRunInput } from '#shared/schemas/run'
import type { ExpectedReading, WiringRun } from '#shared/types/workbook'
import { notFound } from '~~/server/http/appError'
import { listReadings } from '~~/server/repositories/expectedReadings'
import { findRun, insertRun, updateRun } from '~~/server/repositories/runs'
import { listZones } from '~~/server/repositories/zones'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { requireChannel } from '../channels/requireChannel'
import { runSubject } from './runSubject'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'
import { firstVersion } from '../firstVersion'
import { checkZones } from './checkZones'

/** Logs the wiring run of a channel as built, in place of what was logged before, and what it should read with it. */
export function saveRun(
  scope: AircraftScope,
  channelId: number,
  { version, run: input }: SaveRunInput,
): Promise<{ run: WiringRun; readings: ExpectedReading[] }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const channel = await requireChannel(tx, aircraftId, channelId)
    const before = await findRun(tx, aircraftId, channelId)
    await requireVersion(tx, scope, runSubject(channel), before, version)
    checkZones(input, await listZones(tx, aircraftId))
    if (before) await updateRun(tx, aircraftId, before, input)
    else {
      const first = await firstVersion(tx, aircraftId, 'run', channelId)
      await insertRun(tx, aircraftId, { channelId, version: first }, input)
    }
    await rewriteReadings(tx, aircraftId, [channelId])
    const run = await findRun(tx, aircraftId, channelId)
    if (!run) throw notFound('wiring run')
    await recordWrite(tx, scope, {
      action: 'run.saved',
      entityId: channelId,
      before,
      after: run,
    })
    return { run, readings: await listReadings(tx, aircraftId, [channelId]) }
  })
}
