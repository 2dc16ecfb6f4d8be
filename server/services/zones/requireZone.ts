import type { Zone } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { invalidField, notFound } from '~~/server/http/appError'
import { findZone } from '~~/server/repositories/zones'

/** A zone of this aircraft, or 404. */
export async function requireZone(executor: Executor, aircraftId: number, zoneId: number): Promise<Zone> {
  const zone = await findZone(executor, aircraftId, zoneId)
  if (!zone) throw notFound('zone')
  return zone
}

/** Refuses a field that names a zone this aircraft does not have. */
export async function requireZoneOf(
  executor: Executor,
  aircraftId: number,
  zoneId: number | null,
  field: string,
): Promise<void> {
  if (zoneId === null || (await findZone(executor, aircraftId, zoneId))) return
  throw invalidField(field, 'This aircraft has no such zone.')
}

/** A zone as the subject of a versioned write. */
export function zoneSubject({ id, name }: Zone) {
  return { entity: 'zone', entityId: id, called: `zone "${name}"` } as const
}
