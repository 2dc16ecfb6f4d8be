import { conflict } from '~~/server/http/appError'
import { deleteZone } from '~~/server/repositories/zones'
import type { ZoneUses } from '~~/server/repositories/zoneUses'
import { findZoneUses } from '~~/server/repositories/zoneUses'
import { listTemperatures } from '~~/server/repositories/zoneTemperatures'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { nameSome } from '../wording'
import { requireZone, zoneSubject } from './requireZone'

function usesInWords({ tips, joints, displays }: ZoneUses): string[] {
  return [
    ...tips.map((tag) => `the tip of ${tag}`),
    ...joints.map(({ label, tag }) => `${label} of ${tag}`),
    ...displays.map((name) => `the terminals of "${name}"`),
  ]
}

/** Removes a zone that nothing sits in. History keeps how warm it was in each state. */
export function removeZone(scope: AircraftScope, zoneId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const zone = await requireZone(tx, aircraftId, zoneId)
    await requireVersion(tx, scope, zoneSubject(zone), zone, version)
    const uses = usesInWords(await findZoneUses(tx, aircraftId, zoneId))
    if (uses.length > 0) throw conflict(`"${zone.name}" is in use: ${nameSome(uses)}.`)
    const temperatures = await listTemperatures(tx, aircraftId)
    await deleteZone(tx, aircraftId, zoneId)
    await recordWrite(tx, scope, {
      action: 'zone.deleted',
      entityId: zoneId,
      before: { ...zone, temperatures: temperatures.filter((one) => one.zoneId === zoneId) },
      after: null,
    })
  })
}
