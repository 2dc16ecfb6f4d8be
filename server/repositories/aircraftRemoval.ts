import { eq } from 'drizzle-orm'
import type { Transaction } from '~~/server/db/client'
import { aircraft, channels, displays, operatingStates, zones } from '~~/server/db/schema'

/**
 * Removes an aircraft and every record of it, in the order in which records point at one another. Its audit events
 * stay: no foreign key leads out of them.
 */
export async function deleteAircraft(tx: Transaction, aircraftId: number): Promise<void> {
  await tx.delete(channels).where(eq(channels.aircraftId, aircraftId))
  await tx.delete(displays).where(eq(displays.aircraftId, aircraftId))
  await tx.delete(operatingStates).where(eq(operatingStates.aircraftId, aircraftId))
  await tx.delete(zones).where(eq(zones.aircraftId, aircraftId))
  await tx.delete(aircraft).where(eq(aircraft.id, aircraftId))
}
