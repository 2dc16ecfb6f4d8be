import type { CreateDisplayInput } from '#shared/schemas/display'
import type { Display } from '#shared/types/workbook'
import { insertDisplay } from '~~/server/repositories/displays'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite } from '../aircraft/recordWrite'
import { orConflict } from '../orConflict'
import { requireZoneOf } from '../zones/requireZone'
import { displayNameTaken, requireDisplay } from './requireDisplay'

/** Adds a display. No channel reads from it yet, so no reading moves. */
export function createDisplay(
  scope: AircraftScope,
  input: CreateDisplayInput,
): Promise<{ display: Display }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    await requireZoneOf(tx, aircraftId, input.terminalZoneId, 'terminalZoneId')
    const displayId = await orConflict('displays_aircraft_name', displayNameTaken(input.name), () =>
      insertDisplay(tx, aircraftId, input),
    )
    const display = await requireDisplay(tx, aircraftId, displayId)
    await recordWrite(tx, scope, {
      action: 'display.created',
      entityId: displayId,
      before: null,
      after: display,
    })
    return { display }
  })
}
