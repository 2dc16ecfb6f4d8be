import { step } from '../progress.mjs'
import { startApp } from './app-server.mjs'
import { bringUpDatabase, migrateStep } from './database.mjs'
import { accountLines, demoStep } from './demo.mjs'
import { leaveWhenEnds } from './watch.mjs'

/**
 * Database, tables, demo, application: in this order, each needing the one before.
 * @param {{ host: string, port: number }} address
 * @param {import('../setup/secrets.mjs').Secrets} secrets
 * @returns {Promise<{ baseUrl: string, accountText: string }>}
 */
export async function serve(address, secrets) {
  const database = await bringUpDatabase(secrets)
  if (database.server) leaveWhenEnds('MariaDB', database.server.child, database.server.log)
  await migrateStep(database)
  const accounts = await demoStep(database.applicationUrl)
  const app = await step('Serving', async (note) => {
    const running = await startApp({
      ...address,
      databaseUrl: database.applicationUrl,
      sessionPassword: process.env.NUXT_SESSION_PASSWORD || secrets.sessionPassword,
    })
    note(running.baseUrl)
    return running
  })
  leaveWhenEnds('The application', app.child)
  const accountText = accounts.length > 0 ? ['  Demo accounts:', ...accountLines(accounts)].join('\n') : ''
  return { baseUrl: app.baseUrl, accountText }
}
