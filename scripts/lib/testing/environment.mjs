import { step } from '../progress.mjs'
import { choosePort } from '../ports.mjs'
import { findProgram } from '../setup/debian.mjs'
import { demoStep } from '../app/demo.mjs'
import { BROWSER_DATABASE, INTEGRATION_DATABASE, startThrowAwayDatabases } from './throw-away.mjs'

/**
 * Brings up what the integration and browser tests work on, and says where it is in the environment.
 * @returns {Promise<NodeJS.ProcessEnv>}
 */
export async function testEnvironment() {
  const { instance, sessionPassword } = await step('Throw-away MariaDB', async (note) => {
    const started = await startThrowAwayDatabases()
    note(started.instance.remark)
    return started
  })
  const integration = instance.urls(INTEGRATION_DATABASE)
  const browser = instance.urls(BROWSER_DATABASE)
  await demoStep(browser.applicationUrl)
  const port = await choosePort()
  return {
    ...process.env,
    NUXT_SESSION_PASSWORD: sessionPassword,
    TEST_DATABASE_URL: integration.applicationUrl,
    TEST_MIGRATION_DATABASE_URL: integration.ownerUrl,
    E2E_DATABASE_URL: browser.applicationUrl,
    E2E_MIGRATION_DATABASE_URL: browser.ownerUrl,
    E2E_BASE_URL: `http://127.0.0.1:${port}`,
    CHROMIUM_PATH: process.env.CHROMIUM_PATH || findProgram('chromium'),
  }
}
