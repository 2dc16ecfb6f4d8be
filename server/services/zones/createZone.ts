import type { CreateZoneInput } from '#shared/schemas/zone'
import type { Zone } from '#shared/types/workbook'
import { listStates } from '~~/server/repositories/operatingStates'
import { insertZone, nextZonePosition } from '~~/server/repositories/zones'
import { insertTemperatures } from '~~/server/repositories/zoneTemperatures'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite } from '../aircraft/recordWrite'
import { orConflict } from '../orConflict'
import { requireZone } from './requireZone'
import { zoneNameTaken } from './zoneNameTaken'

/** Adds a zone with the same temperature in every operating state. */
export function createZone(
  scope: AircraftScope,
  { name, kind, celsius }: CreateZoneInput,
): Promise<{ zone: Zone }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const position = await nextZonePosition(tx, aircraftId)
    const zoneId = await orConflict('zones_aircraft_name', zoneNameTaken(name), () =>
      insertZone(tx, aircraftId, { name, kind, position }),
    )
    const states = await listStates(tx, aircraftId)
    await insertTemperatures(
      tx,
      aircraftId,
      states.map((state) => ({ stateId: state.id, zoneId, celsius })),
    )
    const zone = await requireZone(tx, aircraftId, zoneId)
    await recordWrite(tx, scope, {
      action: 'zone.created',
      entityId: zone.id,
      before: null,
      after: { ...zone, celsius },
    })
    return { zone }
  })
}
