import type { ZoneGrid } from '#shared/types/workbook'
import { inTransaction } from '~~/server/db/client'
import { loadGrid } from './loadGrid'

/** The zones, states and temperatures of an aircraft. */
export function listGrid(aircraftId: number): Promise<ZoneGrid> {
  return inTransaction((tx) => loadGrid(tx, aircraftId))
}
