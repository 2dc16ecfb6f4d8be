import { isDuplicate } from '~~/server/db/errors'
import { conflict } from '~~/server/http/appError'

/**
 * Runs a write that a unique key may refuse, and says in plain words what stands in its way.
 *
 * @param key name of the unique key
 */
export async function orConflict<Result>(
  key: string,
  { reason, field }: { reason: string; field: string },
  write: () => Promise<Result>,
): Promise<Result> {
  try {
    return await write()
  } catch (error) {
    if (isDuplicate(error, key)) throw conflict(reason, field)
    throw error
  }
}
