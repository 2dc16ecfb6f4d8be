import type { CreateStateInput } from '#shared/schemas/zone'
import type { OperatingState } from '#shared/types/workbook'
import { invalidField } from '~~/server/http/appError'
import { findState, insertState, nextStatePosition } from '~~/server/repositories/operatingStates'
import { insertTemperatures, listTemperatures } from '~~/server/repositories/zoneTemperatures'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite } from '../aircraft/recordWrite'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'
import { orConflict } from '../orConflict'
import { requireState, stateNameTaken } from './requireState'

/** Adds an operating state that begins with the zone temperatures of another, and solves every channel in it. */
export function createState(
  scope: AircraftScope,
  { name, copyFromStateId }: CreateStateInput,
): Promise<{ state: OperatingState }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const source = await findState(tx, aircraftId, copyFromStateId)
    if (!source) throw invalidField('copyFromStateId', 'This aircraft has no such operating state.')
    const position = await nextStatePosition(tx, aircraftId)
    const stateId = await orConflict('operating_states_aircraft_name', stateNameTaken(name), () =>
      insertState(tx, aircraftId, { name, position }),
    )
    const temperatures = await listTemperatures(tx, aircraftId)
    const copied = temperatures.filter((temperature) => temperature.stateId === copyFromStateId)
    await insertTemperatures(
      tx,
      aircraftId,
      copied.map(({ zoneId, celsius }) => ({ stateId, zoneId, celsius })),
    )
    await rewriteReadings(tx, aircraftId)
    const state = await requireState(tx, aircraftId, stateId)
    await recordWrite(tx, scope, {
      action: 'state.created',
      entityId: stateId,
      before: null,
      after: { ...state, copiedFrom: source.name },
    })
    return { state }
  })
}
