import { existsSync } from 'node:fs'
import path from 'node:path'
import { drizzle } from 'drizzle-orm/mysql2'
import { migrate } from 'drizzle-orm/mysql2/migrator'
import mysql from 'mysql2/promise'
import { Failure } from '../failure.mjs'
import { rootFolder } from '../paths.mjs'
import { applicationGrants } from '../mariadb/accounts.mjs'

const MIGRATIONS = path.join(rootFolder, 'drizzle')
const JOURNAL_TABLE = '__drizzle_migrations'
const TURN_SECONDS = 120

/**
 * Brings the tables to the form this version needs.
 * @param {string} url of an account that may alter tables
 * @returns {Promise<{ applied: number }>}
 */
export async function migrateDatabase(url) {
  if (!existsSync(path.join(MIGRATIONS, 'meta', '_journal.json'))) {
    throw new Failure('The migrations are missing from this checkout.', {
      where: MIGRATIONS,
      todo: 'Get the folder back with git, or write the first migration: npm run db:generate',
    })
  }
  const connection = await connect(url)
  try {
    // Two starts against the same database must not migrate it at the same time.
    await connection.query('SELECT GET_LOCK(CONCAT(DATABASE(), ".migrate"), ?)', [TURN_SECONDS])
    const before = await appliedCount(connection)
    await migrate(drizzle(connection), { migrationsFolder: MIGRATIONS }).catch(
      (/** @type {Error} */ error) => {
        throw migrationFailure(error)
      },
    )
    return { applied: (await appliedCount(connection)) - before }
  } finally {
    await connection.end()
  }
}

/** @param {Error} error */
function migrationFailure(error) {
  const cause = error.cause instanceof Error ? error.cause.message : error.message
  return new Failure(`A migration failed: ${cause}.`, {
    where: MIGRATIONS,
    todo:
      'MariaDB cannot take back half a migration. Put the database back as it was before,\n' +
      'or, if it holds nothing of value, drop it and start again.',
  })
}

/**
 * Gives the application account its rights on the tables that are there now.
 * @param {string} ownerUrl
 */
export async function grantApplicationRights(ownerUrl) {
  const connection = await connect(ownerUrl)
  try {
    const database = new URL(ownerUrl).pathname.slice(1)
    const tables = (await tableNames(connection)).filter((name) => name !== JOURNAL_TABLE)
    for (const statement of applicationGrants(database, tables)) await connection.query(statement)
  } finally {
    await connection.end()
  }
}

/**
 * @param {string} url
 * @returns {Promise<mysql.Connection>}
 */
async function connect(url) {
  try {
    return await mysql.createConnection({ uri: url, connectTimeout: 10_000 })
  } catch (error) {
    const { host, pathname } = new URL(url)
    throw new Failure(`The database cannot be used: ${error instanceof Error ? error.message : error}.`, {
      where: `${host}${pathname}`,
      todo: 'Check that the server runs, and that DATABASE_URL has the right host, port, user, password and database.',
    })
  }
}

/** @param {mysql.Connection} connection */
async function tableNames(connection) {
  const [rows] = await connection.query(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE'",
  )
  return /** @type {{ name: string }[]} */ (rows).map(({ name }) => name)
}

/** @param {mysql.Connection} connection */
async function appliedCount(connection) {
  if (!(await tableNames(connection)).includes(JOURNAL_TABLE)) return 0
  const [rows] = await connection.query(`SELECT COUNT(*) AS total FROM ${JOURNAL_TABLE}`)
  return Number(/** @type {{ total: number }[]} */ (rows)[0]?.total ?? 0)
}
