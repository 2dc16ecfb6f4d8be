import type { Role } from '#shared/domain/permissions'
import { ROLES } from '#shared/domain/permissions'
import { verifyPassword } from '~~/server/auth/passwords'
import { closeDatabase, database, inTransaction, openDatabase } from '~~/server/db/client'
import { countAccounts, findAccountByEmail } from '~~/server/repositories/accounts'
import { DEMO_PASSWORD, DEMO_PEOPLE } from './data/people'
import { storePeople } from './storePeople'
import { storeProject } from './storeProject'

export interface DemoAccount {
  email: string
  password: string
  role: string
}

export interface DemoOutcome {
  seeded: boolean
  /** Why it was not loaded; null when it was. */
  reason: string | null
  /** The demo accounts with which somebody can sign in. */
  accounts: DemoAccount[]
}

/**
 * Loads the demo into a database that holds no account, all of it or nothing. It runs outside the server, and through
 * the services of the server, so that its records carry history and readings like any others.
 */
export async function seedDemo(databaseUrl: string): Promise<DemoOutcome> {
  if (isProduction()) return { seeded: false, reason: 'this is a production environment', accounts: [] }
  openDatabase(databaseUrl)
  try {
    if ((await countAccounts(database())) > 0)
      return { seeded: false, reason: 'the database holds data', accounts: await usableAccounts() }
    await inTransaction(async (tx) => storeProject(tx, await storePeople(tx)))
    return { seeded: true, reason: null, accounts: ROLES.map(toDemoAccount) }
  } finally {
    await closeDatabase()
  }
}

function isProduction(): boolean {
  return process.env.NODE_ENV === 'production' || process.env.COWLBOOK_ENV === 'production'
}

/** Those of an earlier loading whose password nobody has changed. */
async function usableAccounts(): Promise<DemoAccount[]> {
  const usable = await Promise.all(
    ROLES.map(async (role) => {
      const found = await findAccountByEmail(database(), DEMO_PEOPLE[role].email)
      return found !== undefined && (await verifyPassword(found.passwordHash, DEMO_PASSWORD))
    }),
  )
  return ROLES.filter((_, index) => usable[index]).map(toDemoAccount)
}

function toDemoAccount(role: Role): DemoAccount {
  return { email: DEMO_PEOPLE[role].email, password: DEMO_PASSWORD, role }
}
