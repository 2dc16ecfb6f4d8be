import type { AircraftQuery } from '#shared/schemas/paging'
import type { Account } from '#shared/types/account'
import type { AircraftListItem, Page } from '#shared/types/workbook'
import { inTransaction } from '~~/server/db/client'
import { countAircraft, pageOfAircraft } from '~~/server/repositories/aircraft'
import { rolesByAircraft } from '~~/server/repositories/aircraftRoles'
import { listStandingRecords } from '~~/server/repositories/channelStandings'
import { groupBy } from '~~/server/db/groupBy'
import { countStandings } from './countStandings'

/** One page of a person's own aircraft, in a number of queries that does not grow with them. */
export function listAircraft(
  account: Pick<Account, 'id'>,
  { page, pageSize, archived }: AircraftQuery,
): Promise<Page<AircraftListItem>> {
  const scope = { userId: account.id, archived }
  return inTransaction(async (tx) => {
    const total = await countAircraft(tx, scope)
    const found = await pageOfAircraft(tx, scope, { page, pageSize })
    const ids = found.map((aircraft) => aircraft.id)
    const roles = await rolesByAircraft(tx, account.id, ids)
    const records = groupBy(await listStandingRecords(tx, ids), (record) => record.aircraftId)
    const items = found.map((aircraft): AircraftListItem => {
      const channels = records.get(aircraft.id) ?? []
      return {
        aircraft,
        roles: roles.get(aircraft.id) ?? [],
        channels: channels.length,
        standings: countStandings(channels),
      }
    })
    return { items, total, page, pageSize }
  })
}
