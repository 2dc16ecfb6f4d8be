import path from 'node:path'
import { asFailure, failureText } from './lib/failure.mjs'
import { dataFolder, rootFolder } from './lib/paths.mjs'
import { elapsedText, step } from './lib/progress.mjs'
import { requireFreePort, servingAddress } from './lib/ports.mjs'
import { isLeaving, leave, leaveOnSignals, waitForTheEnd } from './lib/teardown.mjs'
import { MARIADB, ensureFromDebian } from './lib/setup/debian.mjs'
import { takeLock } from './lib/setup/instance-lock.mjs'
import { ensureNodeModules, requireNode } from './lib/setup/node-modules.mjs'
import { loadSecrets } from './lib/setup/secrets.mjs'
import { ensureBuild } from './lib/app/build.mjs'
import { givenDatabaseUrl } from './lib/app/given-database.mjs'

const begin = Date.now()

leaveOnSignals(() => {
  console.log('\nStopping.')
  return 0
})

/** From a bare checkout to a page that answers. */
async function start() {
  requireNode()
  const address = servingAddress(process.env)
  const hasDatabase = givenDatabaseUrl(process.env) !== undefined
  await requireFreePort(address)
  if (!hasDatabase) {
    await takeLock(path.join(dataFolder, 'start.lock'), 'npm start')
    await ensureFromDebian(MARIADB)
  }
  await ensureNodeModules(rootFolder)
  // Only now: these need npm packages, which a fresh checkout does not have when this script is loaded.
  const { serve } = await import('./lib/app/serve.mjs')
  await step('Application', async (note) => {
    note('building')
    note(await ensureBuild(rootFolder))
  })
  const secrets = await loadSecrets(path.join(dataFolder, 'secrets.json'))
  const { baseUrl, accountText } = await serve(address, secrets)
  console.log(`\nCowlbook is ready after ${elapsedText(Date.now() - begin)}: ${baseUrl}\n`)
  if (accountText) console.log(`${accountText}\n`)
  console.log('Ctrl-C stops it.')
}

console.log('Starting Cowlbook')
start().catch(async (error) => {
  if (isLeaving()) return waitForTheEnd()
  console.error(`\n${failureText(asFailure(error))}\n`)
  await leave(1)
})
