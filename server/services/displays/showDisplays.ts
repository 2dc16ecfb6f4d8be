import type { Display } from '#shared/types/workbook'
import { database } from '~~/server/db/client'
import { listDisplays } from '~~/server/repositories/displays'

/** The displays of an aircraft. */
export async function showDisplays(aircraftId: number): Promise<{ displays: Display[] }> {
  return { displays: await listDisplays(database(), aircraftId) }
}
