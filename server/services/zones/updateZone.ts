import type { UpdateZoneInput } from '#shared/schemas/zone'
import type { Zone } from '#shared/types/workbook'
import { updateZone as storeZone } from '~~/server/repositories/zones'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { orConflict } from '../orConflict'
import { requireZone, zoneSubject } from './requireZone'
import { zoneNameTaken } from './zoneNameTaken'

/** Renames a zone or says what kind of place it is. */
export function updateZone(
  scope: AircraftScope,
  zoneId: number,
  { version, name, kind }: UpdateZoneInput,
): Promise<{ zone: Zone }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const before = await requireZone(tx, aircraftId, zoneId)
    await requireVersion(tx, scope, zoneSubject(before), before, version)
    await orConflict('zones_aircraft_name', zoneNameTaken(name), () =>
      storeZone(tx, aircraftId, before, { name, kind }),
    )
    const zone = await requireZone(tx, aircraftId, zoneId)
    await recordWrite(tx, scope, {
      action: 'zone.updated',
      entityId: zoneId,
      before,
      after: zone,
    })
    return { zone }
  })
}
