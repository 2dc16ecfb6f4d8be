import mysql from 'mysql2/promise'
import type { RowDataPacket } from 'mysql2/promise'
import { inject } from 'vitest'

const JOURNAL_TABLE = '__drizzle_migrations'

/**
 * Empties every table of the test database, except the record of migrations.
 *
 * It works as the owner: the application may not remove audit events. Because of that it looks twice at where it is.
 */
export async function resetDatabase(url: string = inject('ownerDatabaseUrl')): Promise<void> {
  const connection = await mysql.createConnection({ uri: url })
  try {
    await requireTestDatabase(connection)
    await connection.query('SET FOREIGN_KEY_CHECKS = 0')
    for (const table of await filledTables(connection)) {
      // Unlike DELETE it runs no trigger, so a table that forbids deletion can be emptied as well.
      await connection.query(`TRUNCATE TABLE \`${table}\``)
    }
  } finally {
    await connection.end()
  }
}

async function requireTestDatabase(connection: mysql.Connection): Promise<void> {
  const [rows] = await connection.query<RowDataPacket[]>('SELECT DATABASE() AS name')
  const name = String(rows[0]?.name)
  if (!name.endsWith('_test')) throw new Error(`"${name}" is no test database; it was not touched.`)
}

async function filledTables(connection: mysql.Connection): Promise<string[]> {
  const [rows] = await connection.query<RowDataPacket[]>(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE'",
  )
  const names = rows.map((row) => String(row.name)).filter((name) => name !== JOURNAL_TABLE)
  const filled = await Promise.all(names.map((name) => isFilled(connection, name)))
  return names.filter((_, index) => filled[index])
}

async function isFilled(connection: mysql.Connection, table: string): Promise<boolean> {
  const [rows] = await connection.query<RowDataPacket[]>(`SELECT 1 FROM \`${table}\` LIMIT 1`)
  return rows.length > 0
}
