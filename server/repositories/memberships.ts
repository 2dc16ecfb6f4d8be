import { and, asc, eq } from 'drizzle-orm'
import type { Role } from '#shared/domain/permissions'
import type { Person } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { memberships, users } from '~~/server/db/schema'

/** The roles a person holds on an aircraft; none for an outsider and for an aircraft that is not there. */
export async function rolesOn(db: Executor, aircraftId: number, userId: number): Promise<Role[]> {
  const rows = await db
    .select({ role: memberships.role })
    .from(memberships)
    .where(and(eq(memberships.aircraftId, aircraftId), eq(memberships.userId, userId)))
    .orderBy(asc(memberships.role))
  return rows.map(({ role }) => role)
}

export async function addMemberships(
  db: Executor,
  aircraftId: number,
  userId: number,
  roles: readonly Role[],
): Promise<void> {
  await db.insert(memberships).values(roles.map((role) => ({ aircraftId, userId, role })))
}

/** Everybody with a role on the aircraft, by name. */
export async function listPeople(db: Executor, aircraftId: number): Promise<Person[]> {
  const rows = await db
    .select({ userId: users.id, displayName: users.displayName, role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.aircraftId, aircraftId))
    .orderBy(asc(users.displayName), asc(users.id), asc(memberships.role))
  const people = new Map<number, Person>()
  for (const { userId, displayName, role } of rows) {
    const person = people.get(userId) ?? { userId, displayName, roles: [] }
    person.roles.push(role)
    people.set(userId, person)
  }
  return [...people.values()]
}
