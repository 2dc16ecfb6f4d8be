import { randomBytes } from 'node:crypto'
import { existsSync, readdirSync } from 'node:fs'
import { mkdir, rm } from 'node:fs/promises'
import path from 'node:path'
import { dataFolder } from '../paths.mjs'
import { onTeardown } from '../teardown.mjs'
import { lockHolder, takeLock } from '../setup/instance-lock.mjs'
import { completeSecrets } from '../setup/secrets.mjs'
import { stopServersOn } from '../mariadb/left-over.mjs'
import { startInstance } from '../mariadb/instance.mjs'
import { grantApplicationRights, migrateDatabase } from '../app/migrate.mjs'

const PREFIX = 'test-'
const LOCK = 'test.lock'
export const INTEGRATION_DATABASE = 'cowlbook_test'
export const BROWSER_DATABASE = 'cowlbook_e2e_test'

/**
 * A server of its own for one run of the tests, migrated and empty, gone without a trace when the run is over.
 */
export async function startThrowAwayDatabases() {
  await removeLeftOvers()
  const home = path.join(dataFolder, PREFIX + randomBytes(4).toString('hex'))
  onTeardown('the throw-away data', () => rm(home, { recursive: true, force: true }))
  await takeLock(path.join(home, LOCK), 'npm test')
  const { secrets } = completeSecrets({})
  const databases = [INTEGRATION_DATABASE, BROWSER_DATABASE]
  const instance = await startInstance({ home, databases, secrets, throwAway: true })
  for (const database of databases) {
    const { ownerUrl } = instance.urls(database)
    await migrateDatabase(ownerUrl)
    await grantApplicationRights(ownerUrl)
  }
  return { instance, sessionPassword: secrets.sessionPassword }
}

/** What runs that were killed outright have left behind. */
async function removeLeftOvers() {
  await mkdir(dataFolder, { recursive: true })
  const names = readdirSync(dataFolder).filter((name) => name.startsWith(PREFIX))
  for (const name of names) {
    const home = path.join(dataFolder, name)
    const lock = path.join(home, LOCK)
    if (!existsSync(lock) || (await lockHolder(lock))) continue
    await stopServersOn(path.join(home, 'mariadb'))
    await rm(home, { recursive: true, force: true })
  }
}
