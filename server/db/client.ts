import { drizzle } from 'drizzle-orm/mysql2'
import type { Pool } from 'mysql2/promise'
import { createPool } from 'mysql2/promise'
import { isDeadlock } from './errors'
import * as schema from './schema'

/** Well above what one instance needs at a time, well below what MariaDB allows by default (151). */
const CONNECTIONS = 10
const CONNECT_TIMEOUT_MILLISECONDS = 5_000
const DEADLOCK_TRIES = 5
const DEADLOCK_PAUSE_MILLISECONDS = 20

const connect = (pool: Pool) => drizzle(pool, { schema, mode: 'default', casing: 'snake_case' })

export type Database = ReturnType<typeof connect>
/** The same queries within one transaction. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]
/** What a repository works on: either. */
export type Executor = Database | Transaction

interface OpenDatabase {
  pool: Pool
  database: Database
}

let open: OpenDatabase | undefined

/**
 * Opens the one pool of this process. Connections are made when first needed, so a database that is still starting
 * is no error here.
 */
export function openDatabase(url: string): void {
  if (open) throw new Error('The database is open already.')
  const pool = createPool({
    uri: url,
    connectionLimit: CONNECTIONS,
    connectTimeout: CONNECT_TIMEOUT_MILLISECONDS,
    timezone: 'Z',
    charset: 'utf8mb4',
  })
  open = { pool, database: connect(pool) }
}

/** Ends every connection; the pool can be opened again afterwards. */
export async function closeDatabase(): Promise<void> {
  const closing = open
  open = undefined
  await closing?.pool.end()
}

/** The database of this process. */
export function database(): Database {
  if (!open) throw new Error('The database has not been opened.')
  return open.database
}

/**
 * Runs a piece of work in one transaction: all of it is stored, or nothing.
 *
 * MariaDB ends one of two transactions that wait for each other, and it may be ours through no fault of its own: the
 * work is then done again from the start, so it must have no effect outside the database.
 */
export async function inTransaction<Result>(work: (tx: Transaction) => Promise<Result>): Promise<Result> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await database().transaction(work)
    } catch (error) {
      if (!isDeadlock(error) || attempt === DEADLOCK_TRIES) throw error
      await pause(attempt * DEADLOCK_PAUSE_MILLISECONDS * (0.5 + Math.random()))
    }
  }
}

function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds))
}
