import { sql } from 'drizzle-orm'
import { database } from '~~/server/db/client'
import { AppError } from '~~/server/http/appError'

/** Resolves once the database answers. */
export async function checkHealth(): Promise<{ status: 'ok' }> {
  try {
    await database().execute(sql`select 1`)
    return { status: 'ok' }
  } catch (cause) {
    throw new AppError('unavailable', 'The database does not answer.', { retryAfterSeconds: 5, cause })
  }
}
