import type { Transaction } from '~~/server/db/client'
import { advanceChain, insertAuditEvent, lockChain } from '~~/server/repositories/auditEvents'
import type { AuditEntity, AuditEntry } from './actions'
import { hashEvent } from './hash'

/**
 * Adds an event to its chain, in the transaction of the write it tells of: if it cannot be written, nothing is.
 *
 * Writers of one chain queue here until the transaction before them ends, so it comes last in a transaction.
 */
export async function appendAuditEvent(tx: Transaction, entry: AuditEntry): Promise<void> {
  const head = await lockChain(tx, entry.chain)
  const event = {
    ...entry,
    before: entry.before && { ...entry.before },
    after: entry.after && { ...entry.after },
    entity: entityOf(entry),
    sequence: head.sequence + 1,
    at: new Date(),
    previousHash: head.hash,
  }
  const hash = hashEvent(event)
  await insertAuditEvent(tx, { ...event, hash })
  await advanceChain(tx, entry.chain, { sequence: event.sequence, hash })
}

function entityOf({ action }: AuditEntry): AuditEntity {
  return action.slice(0, action.indexOf('.')) as AuditEntity
}
