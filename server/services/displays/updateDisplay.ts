import type { UpdateDisplayInput } from '#shared/schemas/display'
import type { Display } from '#shared/types/workbook'
import type { Transaction } from '~~/server/db/client'
import { conflict } from '~~/server/http/appError'
import { highestInput } from '~~/server/repositories/displayInputs'
import { updateDisplay as storeDisplay } from '~~/server/repositories/displays'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'
import { orConflict } from '../orConflict'
import { requireZoneOf } from '../zones/requireZone'
import { displayNameTaken, displaySubject, requireDisplay } from './requireDisplay'

async function requireInputsInUse(
  tx: Transaction,
  aircraftId: number,
  displayId: number,
  inputs: number,
): Promise<void> {
  const highest = await highestInput(tx, aircraftId, displayId)
  if (!highest || highest.inputNumber === null || highest.inputNumber <= inputs) return
  throw conflict(`Input ${highest.inputNumber} is in use by ${highest.tag}.`, 'inputs')
}

/** Changes a display and every reading that rests on it. */
export function updateDisplay(
  scope: AircraftScope,
  displayId: number,
  { version, ...input }: UpdateDisplayInput,
): Promise<{ display: Display }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const before = await requireDisplay(tx, aircraftId, displayId)
    await requireVersion(tx, scope, displaySubject(before), before, version)
    await requireZoneOf(tx, aircraftId, input.terminalZoneId, 'terminalZoneId')
    await requireInputsInUse(tx, aircraftId, displayId, input.inputs)
    await orConflict('displays_aircraft_name', displayNameTaken(input.name), () =>
      storeDisplay(tx, aircraftId, before, input),
    )
    await rewriteReadings(tx, aircraftId)
    const display = await requireDisplay(tx, aircraftId, displayId)
    await recordWrite(tx, scope, {
      action: 'display.updated',
      entityId: displayId,
      before,
      after: display,
    })
    return { display }
  })
}
