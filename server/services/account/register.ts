import type { RegisterInput } from '#shared/schemas/account'
import { accountChain, appendAuditEvent } from '~~/server/audit'
import { registerLimits } from '~~/server/auth/limits'
import { hashPassword } from '~~/server/auth/passwords'
import { takeAttempt } from '~~/server/auth/rateLimit'
import type { Transaction } from '~~/server/db/client'
import { inTransaction } from '~~/server/db/client'
import { isDuplicate } from '~~/server/db/errors'
import { conflict } from '~~/server/http/appError'
import type { AccountSecrets, NewAccount } from '~~/server/repositories/accounts'
import { findAccount, insertAccount } from '~~/server/repositories/accounts'

/** Makes an account. */
export async function register(input: RegisterInput, address: string): Promise<AccountSecrets> {
  await takeAttempt(registerLimits(address))
  const { email, displayName, password } = input
  const passwordHash = await hashPassword(password)
  try {
    return await inTransaction((tx) => storeAccount(tx, { email, displayName, passwordHash }))
  } catch (error) {
    if (!isDuplicate(error, 'users_email')) throw error
    throw conflict('There is an account with this e-mail address already. Sign in instead.', 'email')
  }
}

/** Stores a new account and the event that tells of it. */
export async function storeAccount(tx: Transaction, account: NewAccount): Promise<AccountSecrets> {
  const id = await insertAccount(tx, account)
  const stored = await findAccount(tx, id)
  if (!stored) throw new Error('The new account was not stored.')
  await appendAuditEvent(tx, {
    chain: accountChain(id),
    actorId: id,
    action: 'account.registered',
    entityId: id,
    before: null,
    // Neither name nor address: what is written here can never be erased.
    after: { preferences: stored.account.preferences },
  })
  return stored
}
