import { and, asc, eq } from 'drizzle-orm'
import type { ZoneTemperature } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { zoneTemperatures } from '~~/server/db/schema'

const temperatureColumns = {
  stateId: zoneTemperatures.stateId,
  zoneId: zoneTemperatures.zoneId,
  celsius: zoneTemperatures.celsius,
  version: zoneTemperatures.version,
}

type TemperatureValues = Pick<ZoneTemperature, 'stateId' | 'zoneId' | 'celsius'>

/** Every zone's temperature in every state of an aircraft, °C. */
export function listTemperatures(executor: Executor, aircraftId: number): Promise<ZoneTemperature[]> {
  return executor
    .select(temperatureColumns)
    .from(zoneTemperatures)
    .where(eq(zoneTemperatures.aircraftId, aircraftId))
    .orderBy(asc(zoneTemperatures.stateId), asc(zoneTemperatures.zoneId))
}

export async function findTemperature(
  executor: Executor,
  aircraftId: number,
  { stateId, zoneId }: Pick<ZoneTemperature, 'stateId' | 'zoneId'>,
): Promise<ZoneTemperature | undefined> {
  const [temperature] = await executor
    .select(temperatureColumns)
    .from(zoneTemperatures)
    .where(
      and(
        eq(zoneTemperatures.aircraftId, aircraftId),
        eq(zoneTemperatures.stateId, stateId),
        eq(zoneTemperatures.zoneId, zoneId),
      ),
    )
  return temperature
}

export async function insertTemperatures(
  tx: Transaction,
  aircraftId: number,
  values: readonly TemperatureValues[],
): Promise<void> {
  if (values.length === 0) return
  await tx.insert(zoneTemperatures).values(values.map((temperature) => ({ ...temperature, aircraftId })))
}

export async function updateTemperature(
  tx: Transaction,
  aircraftId: number,
  { stateId, zoneId, version }: Omit<ZoneTemperature, 'celsius'>,
  celsius: number,
): Promise<void> {
  await tx
    .update(zoneTemperatures)
    .set({ celsius, version: version + 1 })
    .where(
      and(
        eq(zoneTemperatures.aircraftId, aircraftId),
        eq(zoneTemperatures.stateId, stateId),
        eq(zoneTemperatures.zoneId, zoneId),
      ),
    )
}
