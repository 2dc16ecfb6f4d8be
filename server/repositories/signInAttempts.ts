import { and, count, eq, gte, inArray, lt, min } from 'drizzle-orm'
import type { Executor } from '~~/server/db/client'
import { signInAttempts } from '~~/server/db/schema'

/** @returns the id of the attempt */
export async function insertAttempt(db: Executor, subjectHash: string, at: Date): Promise<number> {
  const [row] = await db.insert(signInAttempts).values({ subjectHash, at }).$returningId()
  if (!row) throw new Error('The database gave no id for the attempt.')
  return row.id
}

/** Attempts on the same subject before the one with this id, within the window. */
export async function countEarlierAttempts(
  db: Executor,
  { subjectHash, since, id }: { subjectHash: string; since: Date; id: number },
): Promise<{ count: number; oldest: Date | null }> {
  const [row] = await db
    .select({ count: count(), oldest: min(signInAttempts.at) })
    .from(signInAttempts)
    .where(
      and(
        eq(signInAttempts.subjectHash, subjectHash),
        gte(signInAttempts.at, since),
        lt(signInAttempts.id, id),
      ),
    )
  return row ?? { count: 0, oldest: null }
}

export async function removeAttempts(db: Executor, ids: readonly number[]): Promise<void> {
  if (ids.length > 0) await db.delete(signInAttempts).where(inArray(signInAttempts.id, [...ids]))
}

export async function removeAttemptsBefore(db: Executor, instant: Date): Promise<void> {
  await db.delete(signInAttempts).where(lt(signInAttempts.at, instant))
}
