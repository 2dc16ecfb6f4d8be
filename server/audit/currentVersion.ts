import type { ChangeSummary } from '#shared/types/problem'
import type { Executor } from '~~/server/db/client'
import { AppError } from '~~/server/http/appError'
import type { EntityEvent } from '~~/server/repositories/auditEvents'
import { listEntityEvents } from '~~/server/repositories/auditEvents'
import type { AuditChain, AuditEntity } from './actions'
import { canonicalJson } from './hash'

/** The record a write is about. */
export interface VersionedSubject {
  chain: AuditChain
  entity: AuditEntity
  entityId: number
  /** Fields that tell the record from others with the same key, e.g. the state of a zone's temperature. */
  distinguishedBy?: Readonly<Record<string, unknown>>
  /** What the record is called in a message, e.g. `channel EGT 3`. */
  called: string
}

type Snapshot = Record<string, unknown>

/**
 * Refuses a write that was not based on the record as it now stands, and says what has changed since.
 *
 * @param basedOn the version the writer started from; null when there was no record
 * @param current the record now stored, in the shape the API returns it and the audit keeps it; null when there is none
 * @throws AppError `stale-version`
 */
export async function requireCurrentVersion(
  db: Executor,
  subject: VersionedSubject,
  basedOn: number | null,
  current: { version: number } | null,
): Promise<void> {
  if ((current?.version ?? null) === basedOn) return
  const events = (await listEntityEvents(db, subject.chain, subject.entity, subject.entityId)).filter(
    (event) => isAbout(event, subject.distinguishedBy),
  )
  const [latest] = events
  const changed: ChangeSummary = {
    version: current?.version ?? 0,
    fields: current ? differences(startingPoint(events, basedOn), { ...current }) : [],
    changedBy: latest?.actorName ?? null,
    changedAt: latest?.at.toISOString() ?? null,
  }
  throw new AppError('stale-version', message(subject, current !== null, latest), { changed })
}

function isAbout({ before, after }: EntityEvent, marks: VersionedSubject['distinguishedBy'] = {}): boolean {
  const snapshot: Snapshot = after ?? before ?? {}
  return Object.entries(marks).every(([field, value]) => snapshot[field] === value)
}

/** The record as the writer saw it; undefined when the audit does not tell. */
function startingPoint(events: EntityEvent[], basedOn: number | null): Snapshot | undefined {
  if (basedOn === null) return {}
  const snapshots = events.flatMap(({ before, after }) => [after, before])
  return snapshots.find((snapshot) => snapshot?.version === basedOn) ?? undefined
}

function differences(was: Snapshot | undefined, is: Snapshot): ChangeSummary['fields'] {
  if (!was) return []
  return Object.entries(is)
    .filter(([field]) => field !== 'version' && field !== 'id')
    .filter(([field, current]) => text(was[field]) !== text(current))
    .map(([field, current]) => ({ field, current }))
}

function text(value: unknown): string | undefined {
  return value === undefined ? undefined : canonicalJson(value)
}

function message(subject: VersionedSubject, isThere: boolean, latest: EntityEvent | undefined): string {
  const who = latest?.actorName ?? 'Somebody'
  const what = isThere ? 'changed' : 'removed'
  return `${who} has ${what} the ${subject.called} since you opened it. Nothing of yours was stored.`
}
