import type { Limit } from './rateLimit'

const QUARTER_HOUR = 15 * 60
const HOUR = 60 * 60

/** Guesses at one account, from wherever they come. */
export function signInLimits(email: string, address: string): Limit[] {
  return [
    { subject: `sign-in account ${email}`, attempts: 10, windowSeconds: QUARTER_HOUR },
    // A workshop behind one address may have many people, so it is given more.
    { subject: `sign-in address ${address}`, attempts: 50, windowSeconds: QUARTER_HOUR },
  ]
}

/** Each registration costs a password hash, and tells whether an e-mail address has an account. */
export function registerLimits(address: string): Limit[] {
  return [{ subject: `register address ${address}`, attempts: 60, windowSeconds: HOUR }]
}

/** Guesses at the current password by somebody who found a browser signed in. */
export function passwordLimits(accountId: number): Limit[] {
  return [{ subject: `password account ${accountId}`, attempts: 10, windowSeconds: QUARTER_HOUR }]
}
