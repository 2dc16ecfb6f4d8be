import type { Account } from '#shared/types/account'
import type { Aircraft } from '#shared/types/workbook'
import type { Transaction } from '~~/server/db/client'
import { inTransaction } from '~~/server/db/client'
import { conflict, notFound } from '~~/server/http/appError'
import { lockAircraft } from '~~/server/repositories/aircraft'

/** Who writes, and to which aircraft. */
export interface AircraftScope {
  account: Pick<Account, 'id'>
  aircraftId: number
  /** The larger write this one is a part of; unless given it is a transaction of its own. */
  within?: Transaction
}

/**
 * Runs a write to an aircraft or anything of it. Writers of one aircraft queue at its row, so that what a service
 * reads (versions, free inputs, everything a stored reading rests on) stays true until it has written.
 */
export function lockedAircraft<Result>(
  { aircraftId, within }: Pick<AircraftScope, 'aircraftId' | 'within'>,
  work: (tx: Transaction, aircraft: Aircraft) => Promise<Result>,
): Promise<Result> {
  const locked = async (tx: Transaction) => {
    const aircraft = await lockAircraft(tx, aircraftId)
    if (!aircraft) throw notFound('aircraft')
    return work(tx, aircraft)
  }
  return within ? locked(within) : inTransaction(locked)
}

/** Like `lockedAircraft`, but refuses an archived aircraft: its records are to stay as they were. */
export function changeAircraft<Result>(
  scope: Pick<AircraftScope, 'aircraftId' | 'within'>,
  work: (tx: Transaction, aircraft: Aircraft) => Promise<Result>,
): Promise<Result> {
  return lockedAircraft(scope, (tx, aircraft) => {
    if (aircraft.archivedAt !== null)
      throw conflict(`"${aircraft.name}" is archived. Restore it before changing anything.`)
    return work(tx, aircraft)
  })
}
