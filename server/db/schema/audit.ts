import { bigint, char, index, int, mysqlTable, unique, varchar } from 'drizzle-orm/mysql-core'
import { idColumn, instantColumn, jsonColumn } from '../columns'

/**
 * Every write, in chains by hash. Rows are only ever added: triggers refuse the rest, and no foreign key leads out,
 * so that nothing removed elsewhere can take history with it. Accounts appear by id alone; names can be erased.
 */
export const auditEvents = mysqlTable(
  'audit_events',
  {
    id: bigint({ mode: 'number', unsigned: true }).autoincrement().primaryKey(),
    /** What the event belongs to: `aircraft:12` or `account:3`. */
    chain: varchar({ length: 40 }).notNull(),
    /** Counts from 1 within the chain, without gaps. */
    sequence: int({ unsigned: true }).notNull(),
    at: instantColumn().notNull(),
    actorId: idColumn(),
    action: varchar({ length: 60 }).notNull(),
    entity: varchar({ length: 40 }).notNull(),
    entityId: idColumn(),
    before: jsonColumn<Record<string, unknown>>(),
    after: jsonColumn<Record<string, unknown>>(),
    previousHash: char({ length: 64 }).notNull(),
    hash: char({ length: 64 }).notNull(),
  },
  (table) => [
    unique('audit_events_chain_sequence').on(table.chain, table.sequence),
    index('audit_events_entity').on(table.entity, table.entityId),
  ],
)

/**
 * Where each chain ends. Writers of one chain queue at its row, and a chain cut short is seen: its last event is no
 * longer the one named here.
 */
export const auditChains = mysqlTable('audit_chains', {
  chain: varchar({ length: 40 }).primaryKey(),
  sequence: int({ unsigned: true }).notNull(),
  hash: char({ length: 64 }).notNull(),
})
