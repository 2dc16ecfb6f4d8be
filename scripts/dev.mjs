import path from 'node:path'
import { asFailure, failureText } from './lib/failure.mjs'
import { dataFolder, packageProgram, rootFolder } from './lib/paths.mjs'
import { requireFreePort, servingAddress } from './lib/ports.mjs'
import { isLeaving, leave, leaveOnSignals, onTeardown, waitForTheEnd } from './lib/teardown.mjs'
import { startApart, stopGroup } from './lib/child-processes.mjs'
import { MARIADB, ensureFromDebian } from './lib/setup/debian.mjs'
import { takeLock } from './lib/setup/instance-lock.mjs'
import { ensureNodeModules, requireNode } from './lib/setup/node-modules.mjs'
import { loadSecrets } from './lib/setup/secrets.mjs'
import { givenDatabaseUrl } from './lib/app/given-database.mjs'

leaveOnSignals(() => 0)

/** The database as for `npm start`, then the development server instead of a build. */
async function develop() {
  requireNode()
  const address = servingAddress(process.env)
  await requireFreePort(address)
  if (givenDatabaseUrl(process.env) === undefined) {
    await takeLock(path.join(dataFolder, 'start.lock'), 'npm run dev')
    await ensureFromDebian(MARIADB)
  }
  await ensureNodeModules(rootFolder)
  const { bringUpDatabase, migrateStep } = await import('./lib/app/database.mjs')
  const { accountLines, demoStep } = await import('./lib/app/demo.mjs')
  const secrets = await loadSecrets(path.join(dataFolder, 'secrets.json'))
  const database = await bringUpDatabase(secrets)
  await migrateStep(database)
  const accounts = await demoStep(database.applicationUrl)
  if (accounts.length > 0) console.log(['', ...accountLines(accounts), ''].join('\n'))
  const server = startApart(
    packageProgram('nuxt'),
    ['dev', '--host', address.host, '--port', String(address.port)],
    {
      cwd: rootFolder,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: {
        NUXT_SESSION_PASSWORD: secrets.sessionPassword,
        NUXT_SESSION_COOKIE_SECURE: 'false',
        ...process.env,
        NUXT_DATABASE_URL: database.applicationUrl,
      },
    },
  )
  onTeardown('the development server', () => stopGroup(server))
  server.once('exit', (code) => void leave(code ?? 1))
}

develop().catch(async (error) => {
  if (isLeaving()) return waitForTheEnd()
  console.error(`\n${failureText(asFailure(error))}\n`)
  await leave(1)
})
