import type { Aircraft } from '#shared/types/workbook'
import { conflict } from '~~/server/http/appError'
import { updateAircraft } from '~~/server/repositories/aircraft'
import { aircraftSubject } from './aircraftSubject'
import type { AircraftScope } from './changeAircraft'
import { lockedAircraft } from './changeAircraft'
import { recordWrite, requireVersion } from './recordWrite'
import { requireAircraft } from './requireAircraft'

function moveAircraft(
  scope: AircraftScope,
  version: number,
  action: 'aircraft.archived' | 'aircraft.restored',
): Promise<{ aircraft: Aircraft }> {
  const archives = action === 'aircraft.archived'
  return lockedAircraft(scope, async (tx, before) => {
    await requireVersion(tx, scope, aircraftSubject(before), before, version)
    if ((before.archivedAt !== null) === archives)
      throw conflict(`"${before.name}" is ${archives ? 'archived already' : 'not archived'}.`)
    await updateAircraft(tx, before, { archivedAt: archives ? new Date() : null })
    const aircraft = await requireAircraft(tx, scope.aircraftId)
    await recordWrite(tx, scope, { action, entityId: aircraft.id, before, after: aircraft })
    return { aircraft }
  })
}

/** Takes an aircraft out of the list and closes its records to every write. */
export function archiveAircraft(scope: AircraftScope, version: number): Promise<{ aircraft: Aircraft }> {
  return moveAircraft(scope, version, 'aircraft.archived')
}

/** Opens an archived aircraft again. */
export function restoreAircraft(scope: AircraftScope, version: number): Promise<{ aircraft: Aircraft }> {
  return moveAircraft(scope, version, 'aircraft.restored')
}
