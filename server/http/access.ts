import type { H3Event } from 'h3'
import { may } from '#shared/domain/permissions'
import type { Role, RouteAccess, RouteKey, ROUTES } from '#shared/domain/permissions'
import type { Account } from '#shared/types/account'
import { readSession } from '~~/server/auth/session'
import { database } from '~~/server/db/client'
import { rolesOn } from '~~/server/repositories/memberships'
import { AppError, notFound } from './appError'

/** What is known of whoever asks, by what the route demands. */
export interface SignedIn {
  account: Account
}

export interface OnAircraft extends SignedIn {
  aircraftId: number
  /** At least one; the permission of the route is among theirs. */
  roles: Role[]
}

type AccessOf<Key extends RouteKey> = (typeof ROUTES)[Key]

export type Admission<Key extends RouteKey> =
  AccessOf<Key> extends 'public' ? object : AccessOf<Key> extends 'signed-in' ? SignedIn : OnAircraft

/** Lets the request in or refuses it: 401 without a session, 404 for an outsider, 403 for the wrong role. */
export async function admit(
  event: H3Event,
  access: RouteAccess,
  aircraftId: number | undefined,
): Promise<object | SignedIn | OnAircraft> {
  if (access === 'public') return {}
  const account = await readSession(event)
  if (!account) throw new AppError('unauthenticated', 'Sign in to go on.')
  if (access === 'signed-in') return { account }
  if (aircraftId === undefined) throw new Error(`A route that demands "${access}" names no aircraft.`)
  const roles = await rolesOn(database(), aircraftId, account.id)
  if (roles.length === 0) throw notFound('aircraft')
  if (!may(roles, access)) {
    throw new AppError('forbidden', `As ${roles.join(' and ')} of this aircraft you cannot do this.`)
  }
  return { account, aircraftId, roles }
}
