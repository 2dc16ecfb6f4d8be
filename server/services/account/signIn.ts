import type { SignInInput } from '#shared/schemas/account'
import { signInLimits } from '~~/server/auth/limits'
import { verifyNothing, verifyPassword } from '~~/server/auth/passwords'
import { takeAttempt } from '~~/server/auth/rateLimit'
import { database } from '~~/server/db/client'
import { AppError } from '~~/server/http/appError'
import type { AccountSecrets } from '~~/server/repositories/accounts'
import { findAccountByEmail } from '~~/server/repositories/accounts'

/** Whom an e-mail address and a password belong to. An unknown address is refused like a wrong password. */
export async function signIn({ email, password }: SignInInput, address: string): Promise<AccountSecrets> {
  const attempt = await takeAttempt(signInLimits(email, address))
  const found = await findAccountByEmail(database(), email)
  const isRight = found ? await verifyPassword(found.passwordHash, password) : await verifyNothing(password)
  if (!found || !isRight) {
    throw new AppError('wrong-credentials', 'The e-mail address or the password is wrong.')
  }
  await attempt.forget()
  return found
}
