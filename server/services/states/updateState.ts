import type { UpdateStateInput } from '#shared/schemas/zone'
import type { OperatingState } from '#shared/types/workbook'
import { updateState as storeState } from '~~/server/repositories/operatingStates'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { orConflict } from '../orConflict'
import { requireState, stateNameTaken, stateSubject } from './requireState'

/** Renames an operating state. */
export function updateState(
  scope: AircraftScope,
  stateId: number,
  { version, name }: UpdateStateInput,
): Promise<{ state: OperatingState }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const before = await requireState(tx, aircraftId, stateId)
    await requireVersion(tx, scope, stateSubject(before), before, version)
    await orConflict('operating_states_aircraft_name', stateNameTaken(name), () =>
      storeState(tx, aircraftId, before, { name }),
    )
    const state = await requireState(tx, aircraftId, stateId)
    await recordWrite(tx, scope, {
      action: 'state.updated',
      entityId: stateId,
      before,
      after: state,
    })
    return { state }
  })
}
