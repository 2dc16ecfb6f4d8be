import { and, asc, eq } from 'drizzle-orm'
import type { CreateDisplayInput } from '#shared/schemas/display'
import type { Compensation } from '#shared/thermometry/run'
import type { Display } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { displays } from '~~/server/db/schema'

type DisplayRow = typeof displays.$inferSelect

function toCompensation(row: DisplayRow): Compensation {
  const sensorOffsetKelvin = row.sensorOffsetKelvin ?? 0
  const celsius = row.compensationCelsius ?? 0
  const kind = row.compensationKind
  if (kind === 'none') return { kind }
  if (kind === 'fixed') return { kind, celsius }
  if (kind === 'zeroed') return { kind, ambientCelsius: celsius }
  return { kind, sensorOffsetKelvin }
}

function toDisplay(row: DisplayRow): Display {
  const { id, version, name, inputs, terminalZoneId, gainErrorFraction, offsetKelvin } = row
  const { lowCelsius, highCelsius, notes } = row
  return {
    id,
    version,
    name,
    inputs,
    terminalZoneId,
    compensation: toCompensation(row),
    gainErrorFraction,
    offsetKelvin,
    lowCelsius,
    highCelsius,
    notes,
  }
}

function toCompensationColumns(compensation: Compensation) {
  const figures = { compensationCelsius: null, sensorOffsetKelvin: null }
  const { kind } = compensation
  switch (kind) {
    case 'none':
      return { ...figures, compensationKind: kind }
    case 'fixed':
      return { ...figures, compensationKind: kind, compensationCelsius: compensation.celsius }
    case 'zeroed':
      return { ...figures, compensationKind: kind, compensationCelsius: compensation.ambientCelsius }
    default:
      return { ...figures, compensationKind: kind, sensorOffsetKelvin: compensation.sensorOffsetKelvin }
  }
}

function toColumns({ compensation, ...rest }: CreateDisplayInput) {
  return { ...rest, ...toCompensationColumns(compensation) }
}

/** The displays of an aircraft, oldest first. */
export async function listDisplays(executor: Executor, aircraftId: number): Promise<Display[]> {
  const rows = await executor
    .select()
    .from(displays)
    .where(eq(displays.aircraftId, aircraftId))
    .orderBy(asc(displays.id))
  return rows.map(toDisplay)
}

export async function findDisplay(
  executor: Executor,
  aircraftId: number,
  displayId: number,
): Promise<Display | undefined> {
  const [row] = await executor
    .select()
    .from(displays)
    .where(and(eq(displays.aircraftId, aircraftId), eq(displays.id, displayId)))
  return row && toDisplay(row)
}

export async function insertDisplay(
  tx: Transaction,
  aircraftId: number,
  values: CreateDisplayInput,
): Promise<number> {
  const [row] = await tx
    .insert(displays)
    .values({ ...toColumns(values), aircraftId })
    .$returningId()
  if (!row) throw new Error('The display was stored without an id.')
  return row.id
}

export async function updateDisplay(
  tx: Transaction,
  aircraftId: number,
  display: Pick<Display, 'id' | 'version'>,
  values: CreateDisplayInput,
): Promise<void> {
  await tx
    .update(displays)
    .set({ ...toColumns(values), version: display.version + 1 })
    .where(and(eq(displays.aircraftId, aircraftId), eq(displays.id, display.id)))
}

export async function deleteDisplay(tx: Transaction, aircraftId: number, displayId: number): Promise<void> {
  await tx.delete(displays).where(and(eq(displays.aircraftId, aircraftId), eq(displays.id, displayId)))
}
