import { count, eq, sql } from 'drizzle-orm'
import type { Preferences } from '#shared/schemas/account'
import type { Account } from '#shared/types/account'
import type { Executor } from '~~/server/db/client'
import { users } from '~~/server/db/schema'

/** An account with what proves its holder; never leaves the server. */
export interface AccountSecrets {
  account: Account
  passwordHash: string
  sessionVersion: number
}

export interface NewAccount {
  email: string
  displayName: string
  passwordHash: string
}

type UserRow = typeof users.$inferSelect

function toSecrets(row: UserRow): AccountSecrets {
  const { id, email, displayName, passwordHash, sessionVersion, temperatureUnit, lengthUnit, gaugeUnit } = row
  const account = { id, email, displayName, preferences: { temperatureUnit, lengthUnit, gaugeUnit } }
  return { account, passwordHash, sessionVersion }
}

export async function findAccount(db: Executor, id: number): Promise<AccountSecrets | undefined> {
  const [row] = await db.select().from(users).where(eq(users.id, id))
  return row && toSecrets(row)
}

/** The account of an e-mail address in lower case. */
export async function findAccountByEmail(db: Executor, email: string): Promise<AccountSecrets | undefined> {
  const [row] = await db.select().from(users).where(eq(users.email, email))
  return row && toSecrets(row)
}

/** Like `findAccount`, and nobody else writes to the account until the transaction ends. */
export async function lockAccount(db: Executor, id: number): Promise<AccountSecrets | undefined> {
  const [row] = await db.select().from(users).where(eq(users.id, id)).for('update')
  return row && toSecrets(row)
}

export async function countAccounts(db: Executor): Promise<number> {
  const [row] = await db.select({ total: count() }).from(users)
  return row?.total ?? 0
}

/** @returns the id of the new account */
export async function insertAccount(db: Executor, account: NewAccount): Promise<number> {
  const [row] = await db.insert(users).values(account).$returningId()
  if (!row) throw new Error('The database gave no id for the new account.')
  return row.id
}

/** Stores a new password and ends every session of the account. */
export async function replacePassword(db: Executor, id: number, passwordHash: string): Promise<void> {
  await db
    .update(users)
    .set({ passwordHash, sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(eq(users.id, id))
}

export async function updatePreferences(db: Executor, id: number, preferences: Preferences): Promise<void> {
  await db.update(users).set(preferences).where(eq(users.id, id))
}
