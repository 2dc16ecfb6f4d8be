import { createHash } from 'node:crypto'
import mysql from 'mysql2/promise'
import type { Connection } from 'mysql2/promise'
import { afterAll, beforeAll, inject } from 'vitest'
import { closeDatabase, openDatabase } from '~~/server/db/client'

/** Opens the test database in this process, as the application, for tests that call below the routes. */
export function useTestDatabase(): void {
  beforeAll(() => openDatabase(inject('databaseUrl')))
  afterAll(() => closeDatabase())
}

/** Works as the owner of the tables, who can do what the application must not. */
export async function asOwner<Result>(work: (owner: Connection) => Promise<Result>): Promise<Result> {
  const owner = await mysql.createConnection({ uri: inject('ownerDatabaseUrl') })
  try {
    return await work(owner)
  } finally {
    await owner.end()
  }
}

/** Attempts at a limit that were made a moment ago; many real ones would take a password hash each. */
export async function madeAttempts(subject: string, count: number): Promise<void> {
  await asOwner(async (owner) => {
    const hash = createHash('sha256').update(subject).digest('hex')
    const rows = Array.from({ length: count }, () => [hash, new Date().toISOString().slice(0, -1)])
    await owner.query('INSERT INTO sign_in_attempts (subject_hash, at) VALUES ?', [rows])
  })
}
