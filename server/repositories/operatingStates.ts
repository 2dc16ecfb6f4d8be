import { and, asc, eq, max } from 'drizzle-orm'
import type { OperatingState } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { operatingStates } from '~~/server/db/schema'

const stateColumns = {
  id: operatingStates.id,
  version: operatingStates.version,
  name: operatingStates.name,
  position: operatingStates.position,
}

type StateValues = Pick<OperatingState, 'name' | 'position'>

/** The operating states of an aircraft in their order. */
export function listStates(executor: Executor, aircraftId: number): Promise<OperatingState[]> {
  return executor
    .select(stateColumns)
    .from(operatingStates)
    .where(eq(operatingStates.aircraftId, aircraftId))
    .orderBy(asc(operatingStates.position), asc(operatingStates.id))
}

export async function findState(
  executor: Executor,
  aircraftId: number,
  stateId: number,
): Promise<OperatingState | undefined> {
  const [state] = await executor
    .select(stateColumns)
    .from(operatingStates)
    .where(and(eq(operatingStates.aircraftId, aircraftId), eq(operatingStates.id, stateId)))
  return state
}

/** The position after the last state. */
export async function nextStatePosition(executor: Executor, aircraftId: number): Promise<number> {
  const [row] = await executor
    .select({ last: max(operatingStates.position) })
    .from(operatingStates)
    .where(eq(operatingStates.aircraftId, aircraftId))
  return (row?.last ?? -1) + 1
}

/** Ids in the order of the values given. */
export async function insertStates(
  tx: Transaction,
  aircraftId: number,
  values: readonly StateValues[],
): Promise<number[]> {
  const rows = await tx
    .insert(operatingStates)
    .values(values.map((state) => ({ ...state, aircraftId })))
    .$returningId()
  return rows.map((row) => row.id)
}

export async function insertState(tx: Transaction, aircraftId: number, values: StateValues): Promise<number> {
  const [id] = await insertStates(tx, aircraftId, [values])
  if (id === undefined) throw new Error('The operating state was stored without an id.')
  return id
}

export async function updateState(
  tx: Transaction,
  aircraftId: number,
  state: Pick<OperatingState, 'id' | 'version'>,
  values: Pick<OperatingState, 'name'>,
): Promise<void> {
  await tx
    .update(operatingStates)
    .set({ ...values, version: state.version + 1 })
    .where(and(eq(operatingStates.aircraftId, aircraftId), eq(operatingStates.id, state.id)))
}

/** Its zone temperatures and expected readings go with it. */
export async function deleteState(tx: Transaction, aircraftId: number, stateId: number): Promise<void> {
  await tx
    .delete(operatingStates)
    .where(and(eq(operatingStates.aircraftId, aircraftId), eq(operatingStates.id, stateId)))
}
