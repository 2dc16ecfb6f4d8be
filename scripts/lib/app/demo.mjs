import { step } from '../progress.mjs'
import { loadDemo } from './seed.mjs'

/** @typedef {import('./seed.mjs').DemoAccount} DemoAccount */

/**
 * Loads the demo when the database is empty, unless the surroundings say COWLBOOK_DEMO=no.
 * @param {string} databaseUrl
 * @returns {Promise<DemoAccount[]>} the demo accounts that can sign in
 */
export async function demoStep(databaseUrl) {
  if (process.env.COWLBOOK_DEMO === 'no') return []
  return step('Demo', async (note) => {
    const { seeded, reason, accounts } = await loadDemo(databaseUrl)
    note(seeded ? 'loaded' : `not loaded, ${reason}`)
    return accounts
  })
}

/** @param {DemoAccount[]} accounts */
export function accountLines(accounts) {
  const roleWidth = Math.max(...accounts.map(({ role }) => role.length))
  const emailWidth = Math.max(...accounts.map(({ email }) => email.length))
  return accounts.map(
    ({ role, email, password }) => `    ${role.padEnd(roleWidth)}  ${email.padEnd(emailWidth)}  ${password}`,
  )
}
