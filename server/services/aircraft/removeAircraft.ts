import { deleteAircraft } from '~~/server/repositories/aircraftRemoval'
import { aircraftSubject } from './aircraftSubject'
import type { AircraftScope } from './changeAircraft'
import { lockedAircraft } from './changeAircraft'
import { recordWrite, requireVersion } from './recordWrite'

/** Deletes an aircraft with every record of it. Its history stays, and tells who deleted it. */
export function removeAircraft(scope: AircraftScope, version: number): Promise<void> {
  return lockedAircraft(scope, async (tx, aircraft) => {
    await requireVersion(tx, scope, aircraftSubject(aircraft), aircraft, version)
    await deleteAircraft(tx, scope.aircraftId)
    await recordWrite(tx, scope, {
      action: 'aircraft.deleted',
      entityId: aircraft.id,
      before: aircraft,
      after: null,
    })
  })
}
