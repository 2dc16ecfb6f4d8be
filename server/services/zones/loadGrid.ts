import type { ZoneGrid } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { listStates } from '~~/server/repositories/operatingStates'
import { listZones } from '~~/server/repositories/zones'
import { listTemperatures } from '~~/server/repositories/zoneTemperatures'

/** Zones, operating states and the temperature of each zone in each state, as one consistent picture. */
export async function loadGrid(executor: Executor, aircraftId: number): Promise<ZoneGrid> {
  return {
    zones: await listZones(executor, aircraftId),
    states: await listStates(executor, aircraftId),
    temperatures: await listTemperatures(executor, aircraftId),
  }
}
