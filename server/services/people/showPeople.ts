import type { Person } from '#shared/types/workbook'
import { database } from '~~/server/db/client'
import { listPeople } from '~~/server/repositories/memberships'

/** Everybody with a role on the aircraft. */
export async function showPeople(aircraftId: number): Promise<{ people: Person[] }> {
  return { people: await listPeople(database(), aircraftId) }
}
