import type { ChangePasswordInput } from '#shared/schemas/account'
import type { Account } from '#shared/types/account'
import { accountChain, appendAuditEvent } from '~~/server/audit'
import { passwordLimits } from '~~/server/auth/limits'
import { hashPassword, verifyPassword } from '~~/server/auth/passwords'
import { takeAttempt } from '~~/server/auth/rateLimit'
import { database, inTransaction } from '~~/server/db/client'
import { AppError, conflict, invalidField } from '~~/server/http/appError'
import type { AccountSecrets } from '~~/server/repositories/accounts'
import { findAccount, lockAccount, replacePassword } from '~~/server/repositories/accounts'

/** Changes the password and ends every session, this one too: the caller begins a new one. */
export async function changePassword(
  { id }: Account,
  { currentPassword, newPassword }: ChangePasswordInput,
): Promise<AccountSecrets> {
  const attempt = await takeAttempt(passwordLimits(id))
  const before = required(await findAccount(database(), id))
  if (!(await verifyPassword(before.passwordHash, currentPassword))) {
    throw invalidField('currentPassword', 'This is not your current password.')
  }
  const passwordHash = await hashPassword(newPassword)
  const after = await inTransaction(async (tx) => {
    const locked = required(await lockAccount(tx, id))
    // Hashing takes a while; the password that was checked must still be the one that is replaced.
    if (locked.sessionVersion !== before.sessionVersion) throw conflict('The password was changed meanwhile.')
    await replacePassword(tx, id, passwordHash)
    await appendAuditEvent(tx, {
      chain: accountChain(id),
      actorId: id,
      action: 'account.password-changed',
      entityId: id,
      before: { sessionVersion: locked.sessionVersion },
      after: { sessionVersion: locked.sessionVersion + 1 },
    })
    return required(await findAccount(tx, id))
  })
  await attempt.forget()
  return after
}

function required(account: AccountSecrets | undefined): AccountSecrets {
  if (!account) throw new AppError('unauthenticated', 'This account is no longer there.')
  return account
}
