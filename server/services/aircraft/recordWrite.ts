import type { AuditEntry, VersionedSubject } from '~~/server/audit'
import { aircraftChain, appendAuditEvent, requireCurrentVersion } from '~~/server/audit'
import type { Executor, Transaction } from '~~/server/db/client'
import type { AircraftScope } from './changeAircraft'

/** Adds the event of a write to the chain of the aircraft. The last statement of the write but for reading. */
export function recordWrite(
  tx: Transaction,
  { account, aircraftId }: AircraftScope,
  entry: Omit<AuditEntry, 'chain' | 'actorId'>,
): Promise<void> {
  return appendAuditEvent(tx, { ...entry, chain: aircraftChain(aircraftId), actorId: account.id })
}

/**
 * Refuses a write that was not based on the record as it now stands.
 *
 * @param current the record stored; null when there is none
 * @param basedOn the version the writer started from; null when there was no record
 * @throws AppError `stale-version`, with what has changed since
 */
export function requireVersion(
  executor: Executor,
  { aircraftId }: Pick<AircraftScope, 'aircraftId'>,
  subject: Omit<VersionedSubject, 'chain'>,
  current: { version: number } | null,
  basedOn: number | null,
): Promise<void> {
  return requireCurrentVersion(executor, { ...subject, chain: aircraftChain(aircraftId) }, basedOn, current)
}
