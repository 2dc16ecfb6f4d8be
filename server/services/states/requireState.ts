import type { OperatingState } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { notFound } from '~~/server/http/appError'
import { findState } from '~~/server/repositories/operatingStates'

/** An operating state of this aircraft, or 404. */
export async function requireState(
  executor: Executor,
  aircraftId: number,
  stateId: number,
): Promise<OperatingState> {
  const state = await findState(executor, aircraftId, stateId)
  if (!state) throw notFound('operating state')
  return state
}

/** What is said when another state has the name already. */
export function stateNameTaken(name: string) {
  return { field: 'name', reason: `There is an operating state named "${name}" already.` }
}

/** An operating state as the subject of a versioned write. */
export function stateSubject({ id, name }: OperatingState) {
  return { entity: 'state', entityId: id, called: `operating state "${name}"` } as const
}
