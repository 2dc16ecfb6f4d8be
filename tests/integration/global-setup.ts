import { mkdirSync } from 'node:fs'
import type { TestProject } from 'vitest/node'
import { startApp } from '../../scripts/lib/app/app-server.mjs'
import { choosePort } from '../../scripts/lib/ports.mjs'

declare module 'vitest' {
  interface ProvidedContext {
    /** Where the built server answers, e.g. `http://127.0.0.1:24310`. */
    baseUrl: string
    /** The database it works on, with the rights the application has. */
    databaseUrl: string
    /** The same database with the rights of its owner. */
    ownerDatabaseUrl: string
  }
}

const LOG = 'test-results/integration-server.log'

/** Starts the built server once for all files, on the migrated test database. */
export default async function setup(project: TestProject) {
  const { TEST_DATABASE_URL, TEST_MIGRATION_DATABASE_URL, NUXT_SESSION_PASSWORD } = process.env
  if (!TEST_DATABASE_URL || !TEST_MIGRATION_DATABASE_URL || !NUXT_SESSION_PASSWORD) {
    throw new Error('No test database. Run: node scripts/test.mjs --only integration')
  }
  mkdirSync('test-results', { recursive: true })
  const app = await startApp({
    host: '127.0.0.1',
    port: await choosePort(),
    databaseUrl: TEST_DATABASE_URL,
    sessionPassword: NUXT_SESSION_PASSWORD,
    log: LOG,
  })
  project.provide('baseUrl', app.baseUrl)
  project.provide('databaseUrl', TEST_DATABASE_URL)
  project.provide('ownerDatabaseUrl', TEST_MIGRATION_DATABASE_URL)
  return app.stop
}
