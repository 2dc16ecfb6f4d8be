import path from 'node:path'
import { lockHolder, takeLock } from '../setup/instance-lock.mjs'
import { dataFolder } from '../paths.mjs'
import { step } from '../progress.mjs'
import { instanceUrls, rememberedPort, startInstance } from '../mariadb/instance.mjs'
import { givenDatabaseUrl } from './given-database.mjs'
import { grantApplicationRights, migrateDatabase } from './migrate.mjs'

const DATABASE = 'cowlbook'
export const LOCK_FILE = path.join(dataFolder, 'start.lock')

/**
 * @typedef {object} Database
 * @property {string} ownerUrl may alter tables
 * @property {string} applicationUrl may work with what is in them
 * @property {boolean} isPrivate whether the server is ours, and with it the accounts
 * @property {import('../mariadb/server.mjs').RunningServer} [server] the server, when this process started it
 */

/**
 * Brings up the private server; the lock must be held.
 * @param {import('../setup/secrets.mjs').Secrets} secrets
 * @returns {Promise<Database>}
 */
export function bringUpPrivateDatabase(secrets) {
  return step('Private MariaDB', async (note) => {
    const instance = await startInstance({ home: dataFolder, databases: [DATABASE], secrets })
    note(instance.remark)
    return { ...instance.urls(DATABASE), isPrivate: true, server: instance.server }
  })
}

/**
 * The database the surroundings name, or else the private one.
 * @param {import('../setup/secrets.mjs').Secrets} secrets
 * @returns {Promise<Database>}
 */
export async function bringUpDatabase(secrets) {
  const given = givenDatabaseUrl(process.env)
  if (given === undefined) return bringUpPrivateDatabase(secrets)
  return { ownerUrl: given, applicationUrl: given, isPrivate: false }
}

/**
 * The database for a single task: the one that runs already, or one brought up for as long as the task takes.
 * @param {string} command what this process was started as
 * @param {import('../setup/secrets.mjs').Secrets} secrets
 * @returns {Promise<Database>}
 */
export async function joinOrBringUpDatabase(command, secrets) {
  if (givenDatabaseUrl(process.env) !== undefined) return bringUpDatabase(secrets)
  const port = await rememberedPort(dataFolder)
  if (port !== undefined && (await lockHolder(LOCK_FILE))) {
    return { ...instanceUrls(port, DATABASE, secrets), isPrivate: true }
  }
  await takeLock(LOCK_FILE, command)
  return bringUpPrivateDatabase(secrets)
}

/** Brings the tables up to date, and the rights of the application with them. @param {Database} database */
export function migrateStep({ ownerUrl, isPrivate }) {
  return step('Migrations', async (note) => {
    const { applied } = await migrateDatabase(ownerUrl)
    if (isPrivate) await grantApplicationRights(ownerUrl)
    note(applied === 0 ? 'nothing to do' : `${applied} applied`)
  })
}
