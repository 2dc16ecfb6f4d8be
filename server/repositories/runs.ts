import type { SQL } from 'drizzle-orm'
import { and, eq } from 'drizzle-orm'
import type { WiringRunInput } from '#shared/schemas/run'
import type { WiringRun } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { wiringRuns } from '~~/server/db/schema'
import { deleteRunParts, insertRunParts, listRunParts } from './runParts'

function terminalColumns({ terminals }: WiringRunInput) {
  return {
    terminalsCrossed: terminals.crossed,
    terminalsPositiveOffsetKelvin: terminals.positiveOffsetKelvin,
    terminalsNegativeOffsetKelvin: terminals.negativeOffsetKelvin,
  }
}

async function selectRuns(executor: Executor, condition: SQL | undefined): Promise<WiringRun[]> {
  const rows = await executor.select().from(wiringRuns).where(condition)
  const parts = await listRunParts(
    executor,
    rows.map((row) => row.id),
  )
  return rows.map((row) => ({
    id: row.id,
    version: row.version,
    channelId: row.channelId,
    sections: parts.get(row.id)?.sections ?? [],
    joints: parts.get(row.id)?.joints ?? [],
    terminals: {
      crossed: row.terminalsCrossed,
      positiveOffsetKelvin: row.terminalsPositiveOffsetKelvin,
      negativeOffsetKelvin: row.terminalsNegativeOffsetKelvin,
    },
    savedAt: row.savedAt.toISOString(),
  }))
}

/** Every run of an aircraft with its parts. */
export function listRuns(executor: Executor, aircraftId: number): Promise<WiringRun[]> {
  return selectRuns(executor, eq(wiringRuns.aircraftId, aircraftId))
}

export async function findRun(
  executor: Executor,
  aircraftId: number,
  channelId: number,
): Promise<WiringRun | null> {
  const condition = and(eq(wiringRuns.aircraftId, aircraftId), eq(wiringRuns.channelId, channelId))
  const [run] = await selectRuns(executor, condition)
  return run ?? null
}

/** Channels of an aircraft that have a run. */
export async function channelsWithRun(executor: Executor, aircraftId: number): Promise<Set<number>> {
  const rows = await executor
    .select({ channelId: wiringRuns.channelId })
    .from(wiringRuns)
    .where(eq(wiringRuns.aircraftId, aircraftId))
  return new Set(rows.map((row) => row.channelId))
}

export async function insertRun(
  tx: Transaction,
  aircraftId: number,
  { channelId, version }: Pick<WiringRun, 'channelId' | 'version'>,
  run: WiringRunInput,
): Promise<void> {
  const [row] = await tx
    .insert(wiringRuns)
    .values({ ...terminalColumns(run), aircraftId, channelId, version, savedAt: new Date() })
    .$returningId()
  if (!row) throw new Error('The run was stored without an id.')
  await insertRunParts(tx, row.id, run)
}

/** Replaces the parts of a run. */
export async function updateRun(
  tx: Transaction,
  aircraftId: number,
  { id, version }: Pick<WiringRun, 'id' | 'version'>,
  run: WiringRunInput,
): Promise<void> {
  await tx
    .update(wiringRuns)
    .set({ ...terminalColumns(run), savedAt: new Date(), version: version + 1 })
    .where(and(eq(wiringRuns.aircraftId, aircraftId), eq(wiringRuns.id, id)))
  await deleteRunParts(tx, id)
  await insertRunParts(tx, id, run)
}

/** Its sections and joints go with it. */
export async function deleteRun(tx: Transaction, aircraftId: number, runId: number): Promise<void> {
  await tx.delete(wiringRuns).where(and(eq(wiringRuns.aircraftId, aircraftId), eq(wiringRuns.id, runId)))
}
