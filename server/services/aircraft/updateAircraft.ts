import type { UpdateAircraftInput } from '#shared/schemas/aircraft'
import type { Aircraft } from '#shared/types/workbook'
import { updateAircraft as storeAircraft } from '~~/server/repositories/aircraft'
import { aircraftSubject } from './aircraftSubject'
import type { AircraftScope } from './changeAircraft'
import { changeAircraft } from './changeAircraft'
import { recordWrite, requireVersion } from './recordWrite'
import { requireAircraft } from './requireAircraft'

/** Renames an aircraft, gives it a registration or another cable standard. */
export function updateAircraft(
  scope: AircraftScope,
  { version, ...values }: UpdateAircraftInput,
): Promise<{ aircraft: Aircraft }> {
  return changeAircraft(scope, async (tx, before) => {
    await requireVersion(tx, scope, aircraftSubject(before), before, version)
    await storeAircraft(tx, before, values)
    const aircraft = await requireAircraft(tx, scope.aircraftId)
    await recordWrite(tx, scope, {
      action: 'aircraft.updated',
      entityId: aircraft.id,
      before,
      after: aircraft,
    })
    return { aircraft }
  })
}
