import type { H3Event } from 'h3'
import { deleteCookie, getCookie } from 'h3'
import type { Account } from '#shared/types/account'
import { database } from '~~/server/db/client'
import type { AccountSecrets } from '~~/server/repositories/accounts'
import { findAccount } from '~~/server/repositories/accounts'
import { SESSION_COOKIE } from './sessionCookie'

// clearUserSession, getUserSession and replaceUserSession come from nuxt-auth-utils, which offers them to Nitro's
// automatic imports alone.

declare module '#auth-utils' {
  interface SecureSessionData {
    accountId: number
    sessionVersion: number
  }
}

/**
 * Whose session the request carries; null without one. A sealed cookie cannot be called back, so its version is
 * compared with the account's on every request.
 */
export async function readSession(event: H3Event): Promise<Account | null> {
  // Reading a session where there is none would start one, and set a cookie on people who never sign in.
  if (!getCookie(event, SESSION_COOKIE)) return null
  const { secure } = await getUserSession(event)
  if (!secure) return null
  const found = await findAccount(database(), secure.accountId)
  if (found && found.sessionVersion === secure.sessionVersion) return found.account
  await endSession(event)
  return null
}

/** Begins a session of its own for this browser, whatever it carried before. */
export async function startSession(
  event: H3Event,
  { account, sessionVersion }: Pick<AccountSecrets, 'account' | 'sessionVersion'>,
): Promise<void> {
  // With the old cookie in sight the library would carry the old session on: its id, and the end of its life.
  delete event.node.req.headers.cookie
  await replaceUserSession(event, { secure: { accountId: account.id, sessionVersion } })
}

export async function endSession(event: H3Event): Promise<void> {
  await clearUserSession(event)
  // The library leaves an empty cookie behind.
  deleteCookie(event, SESSION_COOKIE, { path: '/' })
}
