import { conflict } from '~~/server/http/appError'
import { deleteState, listStates } from '~~/server/repositories/operatingStates'
import { listTemperatures } from '~~/server/repositories/zoneTemperatures'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { requireState, stateSubject } from './requireState'

/**
 * Removes an operating state with its readings; an aircraft keeps at least one. History keeps its temperatures.
 */
export function removeState(scope: AircraftScope, stateId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const state = await requireState(tx, aircraftId, stateId)
    await requireVersion(tx, scope, stateSubject(state), state, version)
    if ((await listStates(tx, aircraftId)).length === 1)
      throw conflict(`"${state.name}" is the only operating state, and an aircraft needs one.`)
    const temperatures = await listTemperatures(tx, aircraftId)
    await deleteState(tx, aircraftId, stateId)
    await recordWrite(tx, scope, {
      action: 'state.deleted',
      entityId: stateId,
      before: { ...state, temperatures: temperatures.filter((one) => one.stateId === stateId) },
      after: null,
    })
  })
}
