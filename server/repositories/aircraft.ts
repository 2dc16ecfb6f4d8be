import { and, asc, count, eq, isNotNull, isNull } from 'drizzle-orm'
import type { CreateAircraftInput } from '#shared/schemas/aircraft'
import type { Aircraft } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { aircraft, memberships } from '~~/server/db/schema'

const aircraftColumns = {
  id: aircraft.id,
  version: aircraft.version,
  name: aircraft.name,
  registration: aircraft.registration,
  cableStandard: aircraft.cableStandard,
  layout: aircraft.layout,
  archivedAt: aircraft.archivedAt,
  createdAt: aircraft.createdAt,
}

type AircraftRow = Pick<typeof aircraft.$inferSelect, keyof typeof aircraftColumns>

function toAircraft(row: AircraftRow): Aircraft {
  return {
    ...row,
    archivedAt: row.archivedAt?.toISOString() ?? null,
    createdAt: row.createdAt.toISOString(),
  }
}

export async function findAircraft(executor: Executor, aircraftId: number): Promise<Aircraft | undefined> {
  const [row] = await executor.select(aircraftColumns).from(aircraft).where(eq(aircraft.id, aircraftId))
  return row && toAircraft(row)
}

/** Like `findAircraft`, and nobody else writes to the aircraft until the transaction ends. */
export async function lockAircraft(tx: Transaction, aircraftId: number): Promise<Aircraft | undefined> {
  const [row] = await tx
    .select(aircraftColumns)
    .from(aircraft)
    .where(eq(aircraft.id, aircraftId))
    .for('update')
  return row && toAircraft(row)
}

export interface AircraftOfPerson {
  userId: number
  archived: boolean
}

/** One page of the aircraft on which a person has a role, by name. */
export async function pageOfAircraft(
  executor: Executor,
  scope: AircraftOfPerson,
  { page, pageSize }: { page: number; pageSize: number },
): Promise<Aircraft[]> {
  const rows = await executor
    .selectDistinct(aircraftColumns)
    .from(aircraft)
    .innerJoin(memberships, eq(memberships.aircraftId, aircraft.id))
    .where(ofPerson(scope))
    .orderBy(asc(aircraft.name), asc(aircraft.id))
    .limit(pageSize)
    .offset((page - 1) * pageSize)
  return rows.map(toAircraft)
}

export async function countAircraft(executor: Executor, scope: AircraftOfPerson): Promise<number> {
  const own = executor
    .selectDistinct({ id: aircraft.id })
    .from(aircraft)
    .innerJoin(memberships, eq(memberships.aircraftId, aircraft.id))
    .where(ofPerson(scope))
    .as('own')
  const [row] = await executor.select({ total: count() }).from(own)
  return row?.total ?? 0
}

function ofPerson({ userId, archived }: AircraftOfPerson) {
  const inList = archived ? isNotNull(aircraft.archivedAt) : isNull(aircraft.archivedAt)
  return and(eq(memberships.userId, userId), inList)
}

export async function insertAircraft(
  tx: Transaction,
  values: Pick<CreateAircraftInput, 'name' | 'registration' | 'cableStandard' | 'layout'>,
  createdBy: number,
): Promise<number> {
  const [row] = await tx
    .insert(aircraft)
    .values({ ...values, createdBy })
    .$returningId()
  if (!row) throw new Error('The aircraft was stored without an id.')
  return row.id
}

export async function updateAircraft(
  tx: Transaction,
  { id, version }: Pick<Aircraft, 'id' | 'version'>,
  values: Partial<Pick<Aircraft, 'name' | 'registration' | 'cableStandard'>> & { archivedAt?: Date | null },
): Promise<void> {
  await tx
    .update(aircraft)
    .set({ ...values, version: version + 1 })
    .where(eq(aircraft.id, id))
}
