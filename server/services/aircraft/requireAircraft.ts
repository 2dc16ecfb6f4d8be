import type { Aircraft } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { notFound } from '~~/server/http/appError'
import { findAircraft } from '~~/server/repositories/aircraft'

/** The aircraft, or 404. */
export async function requireAircraft(executor: Executor, aircraftId: number): Promise<Aircraft> {
  const aircraft = await findAircraft(executor, aircraftId)
  if (!aircraft) throw notFound('aircraft')
  return aircraft
}
