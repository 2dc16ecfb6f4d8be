import type { Display } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { notFound } from '~~/server/http/appError'
import { findDisplay } from '~~/server/repositories/displays'

/** A display of this aircraft, or 404. */
export async function requireDisplay(
  executor: Executor,
  aircraftId: number,
  displayId: number,
): Promise<Display> {
  const display = await findDisplay(executor, aircraftId, displayId)
  if (!display) throw notFound('display')
  return display
}

/** What is said when another display has the name already. */
export function displayNameTaken(name: string) {
  return { field: 'name', reason: `There is a display named "${name}" already.` }
}

/** A display as the subject of a versioned write. */
export function displaySubject({ id, name }: Display) {
  return { entity: 'display', entityId: id, called: `display "${name}"` } as const
}
