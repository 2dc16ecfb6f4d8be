import path from 'node:path'
import { asFailure, failureText } from '../failure.mjs'
import { dataFolder, rootFolder } from '../paths.mjs'
import { isLeaving, leave, leaveOnSignals, waitForTheEnd } from '../teardown.mjs'
import { MARIADB, ensureFromDebian } from '../setup/debian.mjs'
import { ensureNodeModules, requireNode } from '../setup/node-modules.mjs'
import { loadSecrets } from '../setup/secrets.mjs'
import { givenDatabaseUrl } from './given-database.mjs'

const INTERRUPTED = 130

/**
 * Does one thing with the database, bringing it up for that long when it does not run.
 * @param {string} command what this process was started as
 * @param {(database: import('./database.mjs').Database) => Promise<void>} task
 */
export async function withDatabase(command, task) {
  leaveOnSignals(() => INTERRUPTED)
  try {
    requireNode()
    if (givenDatabaseUrl(process.env) === undefined) await ensureFromDebian(MARIADB)
    await ensureNodeModules(rootFolder)
    const { joinOrBringUpDatabase } = await import('./database.mjs')
    const secrets = await loadSecrets(path.join(dataFolder, 'secrets.json'))
    await task(await joinOrBringUpDatabase(command, secrets))
    await leave(0)
  } catch (error) {
    if (isLeaving()) return waitForTheEnd()
    console.error(`\n${failureText(asFailure(error))}\n`)
    await leave(1)
  }
}
