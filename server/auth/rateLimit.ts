import { createHash } from 'node:crypto'
import { database } from '~~/server/db/client'
import { AppError } from '~~/server/http/appError'
import {
  countEarlierAttempts,
  insertAttempt,
  removeAttempts,
  removeAttemptsBefore,
} from '~~/server/repositories/signInAttempts'

/** So many attempts within a window that slides along. */
export interface Limit {
  /** What is limited, e.g. `sign-in address 192.0.2.7`. */
  subject: string
  attempts: number
  windowSeconds: number
}

/** Longer than any window; older attempts are of no use. */
const KEPT_SECONDS = 24 * 60 * 60

/** An attempt that was let through. */
export interface Attempt {
  /** Takes the attempt back: it succeeded, and success is no attack. */
  forget(): Promise<void>
}

/**
 * Counts an attempt against every limit, before anything costly or telling is done.
 *
 * The attempt is written first and compared with the ones before it. However many arrive at once, at however many
 * instances, no more than the limit are let through.
 *
 * @throws AppError `rate-limited`, with the time after which the next attempt may succeed
 */
export async function takeAttempt(limits: readonly Limit[]): Promise<Attempt> {
  const now = new Date()
  await removeAttemptsBefore(database(), secondsBefore(now, KEPT_SECONDS))
  const ids: number[] = []
  const forget = () => removeAttempts(database(), ids)
  for (const limit of limits) {
    const subjectHash = hashSubject(limit.subject)
    const id = await insertAttempt(database(), subjectHash, now)
    ids.push(id)
    const since = secondsBefore(now, limit.windowSeconds)
    const earlier = await countEarlierAttempts(database(), { subjectHash, since, id })
    if (earlier.count < limit.attempts) continue
    // One that was refused does not count, or whoever keeps trying would never be let in again.
    await forget()
    const freeAt = (earlier.oldest ?? now).getTime() + limit.windowSeconds * 1000
    throw tooMany(Math.max(1, Math.ceil((freeAt - now.getTime()) / 1000)))
  }
  return { forget }
}

function hashSubject(subject: string): string {
  return createHash('sha256').update(subject).digest('hex')
}

function secondsBefore(instant: Date, seconds: number): Date {
  return new Date(instant.getTime() - seconds * 1000)
}

function tooMany(retryAfterSeconds: number): AppError {
  const minutes = Math.ceil(retryAfterSeconds / 60)
  const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`
  return new AppError('rate-limited', `There were too many attempts. Try again in ${wait}.`, {
    retryAfterSeconds,
  })
}
