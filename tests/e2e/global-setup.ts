import { mkdirSync } from 'node:fs'
import { startApp } from '../../scripts/lib/app/app-server.mjs'

const LOG = 'test-results/e2e-server.log'

/** Starts the built server on a database of its own that holds the demo; it is stopped after the last test. */
export default async function setup() {
  const { E2E_BASE_URL, E2E_DATABASE_URL, NUXT_SESSION_PASSWORD } = process.env
  if (!E2E_BASE_URL || !E2E_DATABASE_URL || !NUXT_SESSION_PASSWORD) {
    throw new Error('No server to test. Run: node scripts/test.mjs --only e2e')
  }
  mkdirSync('test-results', { recursive: true })
  const { hostname, port } = new URL(E2E_BASE_URL)
  const app = await startApp({
    host: hostname,
    port: Number(port),
    databaseUrl: E2E_DATABASE_URL,
    sessionPassword: NUXT_SESSION_PASSWORD,
    log: LOG,
  })
  return app.stop
}
