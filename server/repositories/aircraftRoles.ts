import { and, asc, eq, inArray } from 'drizzle-orm'
import type { Role } from '#shared/domain/permissions'
import type { Executor } from '~~/server/db/client'
import { memberships } from '~~/server/db/schema'
import { groupBy } from '~~/server/db/groupBy'

/** The roles of one person on several aircraft, in one query. */
export async function rolesByAircraft(
  executor: Executor,
  userId: number,
  aircraftIds: readonly number[],
): Promise<Map<number, Role[]>> {
  if (aircraftIds.length === 0) return new Map()
  const rows = await executor
    .select({ aircraftId: memberships.aircraftId, role: memberships.role })
    .from(memberships)
    .where(and(eq(memberships.userId, userId), inArray(memberships.aircraftId, [...aircraftIds])))
    .orderBy(asc(memberships.aircraftId), asc(memberships.role))
  const groups = groupBy(rows, (row) => row.aircraftId)
  return new Map([...groups].map(([aircraftId, held]) => [aircraftId, held.map(({ role }) => role)]))
}
