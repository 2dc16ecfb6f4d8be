import path from 'node:path'
import { createJiti } from 'jiti'
import { rootFolder } from '../paths.mjs'

/** @typedef {{ email: string, password: string, role: string }} DemoAccount */
/** @typedef {{ seeded: boolean, reason: string | null, accounts: DemoAccount[] }} Seeding */
/** @typedef {{ seedDemo: (databaseUrl: string) => Promise<Seeding> }} SeedModule */

/**
 * Loads the demo into a database that is empty; one that holds anything is left as it is.
 * @param {string} databaseUrl
 * @returns {Promise<Seeding>}
 */
export async function loadDemo(databaseUrl) {
  const jiti = createJiti(import.meta.url, {
    alias: { '#shared': path.join(rootFolder, 'shared'), '~~': rootFolder },
  })
  const module = await jiti.import(path.join(rootFolder, 'server/demo/seed.ts'))
  return /** @type {SeedModule} */ (module).seedDemo(databaseUrl)
}
