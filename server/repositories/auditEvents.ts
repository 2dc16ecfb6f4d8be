import { and, asc, count, desc, eq, gt } from 'drizzle-orm'
import type { HistoryEvent } from '#shared/types/workbook'
import { FIRST_PREVIOUS_HASH } from '~~/server/audit/hash'
import type { Executor, Transaction } from '~~/server/db/client'
import { auditChains, auditEvents, users } from '~~/server/db/schema'

export type StoredAuditEvent = typeof auditEvents.$inferSelect

/** Where a chain ends. */
export interface ChainHead {
  sequence: number
  hash: string
}

export type EntityEvent = Pick<StoredAuditEvent, 'at' | 'before' | 'after'> & { actorName: string | null }

/** The end of a chain, which nobody else moves until the transaction ends; a new chain is begun here. */
export async function lockChain(tx: Transaction, chain: string): Promise<ChainHead> {
  // One statement, so that of two writers who begin a chain at once the second waits and then finds it.
  await tx
    .insert(auditChains)
    .values({ chain, sequence: 0, hash: FIRST_PREVIOUS_HASH })
    .onDuplicateKeyUpdate({ set: { chain } })
  const [head] = await tx.select().from(auditChains).where(eq(auditChains.chain, chain)).for('update')
  if (!head) throw new Error(`The audit chain ${chain} could not be begun.`)
  return head
}

export async function advanceChain(tx: Transaction, chain: string, head: ChainHead): Promise<void> {
  await tx
    .update(auditChains)
    .set({ sequence: head.sequence, hash: head.hash })
    .where(eq(auditChains.chain, chain))
}

export async function insertAuditEvent(
  tx: Transaction,
  { chain, sequence, at, actorId, action, entity, entityId, ...rest }: Omit<StoredAuditEvent, 'id'>,
): Promise<void> {
  const { before, after, previousHash, hash } = rest
  await tx
    .insert(auditEvents)
    .values({ chain, sequence, at, actorId, action, entity, entityId, before, after, previousHash, hash })
}

export async function readChainHead(db: Executor, chain: string): Promise<ChainHead | undefined> {
  const [head] = await db.select().from(auditChains).where(eq(auditChains.chain, chain))
  return head
}

/** The next events of a chain after a sequence number, oldest first. */
export async function readChain(
  db: Executor,
  chain: string,
  afterSequence: number,
  limit: number,
): Promise<StoredAuditEvent[]> {
  return await db
    .select()
    .from(auditEvents)
    .where(and(eq(auditEvents.chain, chain), gt(auditEvents.sequence, afterSequence)))
    .orderBy(asc(auditEvents.sequence))
    .limit(limit)
}

/** What happened to one record, newest first. */
export async function listEntityEvents(
  db: Executor,
  chain: string,
  entity: string,
  entityId: number,
): Promise<EntityEvent[]> {
  return await db
    .select({
      at: auditEvents.at,
      before: auditEvents.before,
      after: auditEvents.after,
      actorName: users.displayName,
    })
    .from(auditEvents)
    .leftJoin(users, eq(users.id, auditEvents.actorId))
    .where(
      and(eq(auditEvents.chain, chain), eq(auditEvents.entity, entity), eq(auditEvents.entityId, entityId)),
    )
    .orderBy(desc(auditEvents.sequence))
}

/** One page of a chain for people to read, newest first. */
export async function listHistory(
  db: Executor,
  chain: string,
  { page, pageSize }: { page: number; pageSize: number },
): Promise<{ items: HistoryEvent[]; total: number }> {
  const [counted] = await db.select({ total: count() }).from(auditEvents).where(eq(auditEvents.chain, chain))
  const rows = await db
    .select({ event: auditEvents, actorName: users.displayName })
    .from(auditEvents)
    .leftJoin(users, eq(users.id, auditEvents.actorId))
    .where(eq(auditEvents.chain, chain))
    .orderBy(desc(auditEvents.sequence))
    .limit(pageSize)
    .offset((page - 1) * pageSize)
  return {
    items: rows.map(({ event, actorName }) => toHistory(event, actorName)),
    total: counted?.total ?? 0,
  }
}

function toHistory(event: StoredAuditEvent, actorName: string | null): HistoryEvent {
  const { sequence, at, actorId, action, entity, entityId, before, after, hash } = event
  return { sequence, at: at.toISOString(), actorId, actorName, action, entity, entityId, before, after, hash }
}
