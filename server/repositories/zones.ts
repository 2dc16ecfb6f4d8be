import { and, asc, eq, max } from 'drizzle-orm'
import type { Zone } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { zones } from '~~/server/db/schema'

const zoneColumns = {
  id: zones.id,
  version: zones.version,
  name: zones.name,
  kind: zones.kind,
  position: zones.position,
}

type ZoneValues = Pick<Zone, 'name' | 'kind' | 'position'>

/** The zones of an aircraft in their order. */
export function listZones(executor: Executor, aircraftId: number): Promise<Zone[]> {
  return executor
    .select(zoneColumns)
    .from(zones)
    .where(eq(zones.aircraftId, aircraftId))
    .orderBy(asc(zones.position), asc(zones.id))
}

export async function findZone(
  executor: Executor,
  aircraftId: number,
  zoneId: number,
): Promise<Zone | undefined> {
  const [zone] = await executor
    .select(zoneColumns)
    .from(zones)
    .where(and(eq(zones.aircraftId, aircraftId), eq(zones.id, zoneId)))
  return zone
}

/** The position after the last zone. */
export async function nextZonePosition(executor: Executor, aircraftId: number): Promise<number> {
  const [row] = await executor
    .select({ last: max(zones.position) })
    .from(zones)
    .where(eq(zones.aircraftId, aircraftId))
  return (row?.last ?? -1) + 1
}

/** Ids in the order of the values given. */
export async function insertZones(
  tx: Transaction,
  aircraftId: number,
  values: readonly ZoneValues[],
): Promise<number[]> {
  const rows = await tx
    .insert(zones)
    .values(values.map((zone) => ({ ...zone, aircraftId })))
    .$returningId()
  return rows.map((row) => row.id)
}

export async function insertZone(tx: Transaction, aircraftId: number, values: ZoneValues): Promise<number> {
  const [id] = await insertZones(tx, aircraftId, [values])
  if (id === undefined) throw new Error('The zone was stored without an id.')
  return id
}

export async function updateZone(
  tx: Transaction,
  aircraftId: number,
  zone: Pick<Zone, 'id' | 'version'>,
  values: Pick<Zone, 'name' | 'kind'>,
): Promise<void> {
  await tx
    .update(zones)
    .set({ ...values, version: zone.version + 1 })
    .where(and(eq(zones.aircraftId, aircraftId), eq(zones.id, zone.id)))
}

export async function deleteZone(tx: Transaction, aircraftId: number, zoneId: number): Promise<void> {
  await tx.delete(zones).where(and(eq(zones.aircraftId, aircraftId), eq(zones.id, zoneId)))
}
