import { and, asc, eq, inArray } from 'drizzle-orm'
import type { Indication } from '#shared/thermometry/run'
import type { ExpectedReading } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { expectedReadings } from '~~/server/db/schema'

type ReadingRow = typeof expectedReadings.$inferSelect

function toIndication({ indication: kind, indicatedCelsius, limitCelsius }: ReadingRow): Indication {
  if (kind === 'withheld') return { kind }
  if (kind === 'value') return { kind, celsius: figure(indicatedCelsius) }
  return { kind, limitCelsius: figure(limitCelsius) }
}

/** The table's checks make sure that the figure is there. */
function figure(stored: number | null): number {
  if (stored === null) throw new Error('A stored reading lacks its figure.')
  return stored
}

function toReading(row: ReadingRow): ExpectedReading {
  const { channelId, stateId, tipCelsius, terminalMillivolts, errorKelvin, findingCodes } = row
  return {
    channelId,
    stateId,
    tipCelsius,
    terminalMillivolts,
    indication: toIndication(row),
    errorKelvin,
    findingCodes,
  }
}

function toColumns({ indication, ...reading }: ExpectedReading) {
  return {
    ...reading,
    indication: indication.kind,
    indicatedCelsius: indication.kind === 'value' ? indication.celsius : null,
    limitCelsius: 'limitCelsius' in indication ? indication.limitCelsius : null,
  }
}

/** The stored readings of an aircraft, or of some of its channels. */
export async function listReadings(
  executor: Executor,
  aircraftId: number,
  channelIds?: readonly number[],
): Promise<ExpectedReading[]> {
  if (channelIds?.length === 0) return []
  const ofChannels = channelIds && inArray(expectedReadings.channelId, [...channelIds])
  const rows = await executor
    .select()
    .from(expectedReadings)
    .where(and(eq(expectedReadings.aircraftId, aircraftId), ofChannels))
    .orderBy(asc(expectedReadings.channelId), asc(expectedReadings.stateId))
  return rows.map(toReading)
}

/** Puts these readings in the place of whatever is stored for the channels. */
export async function replaceReadings(
  tx: Transaction,
  aircraftId: number,
  channelIds: readonly number[],
  readings: readonly ExpectedReading[],
): Promise<void> {
  if (channelIds.length === 0) return
  await tx
    .delete(expectedReadings)
    .where(
      and(eq(expectedReadings.aircraftId, aircraftId), inArray(expectedReadings.channelId, [...channelIds])),
    )
  if (readings.length === 0) return
  const solvedAt = new Date()
  await tx
    .insert(expectedReadings)
    .values(readings.map((reading) => ({ ...toColumns(reading), aircraftId, solvedAt })))
}
