import type { Role } from '#shared/domain/permissions'
import type { AircraftSheet } from '#shared/types/workbook'
import { inTransaction } from '~~/server/db/client'
import { listStandingRecords } from '~~/server/repositories/channelStandings'
import { listPeople } from '~~/server/repositories/memberships'
import { listStates } from '~~/server/repositories/operatingStates'
import { countStandings } from './countStandings'
import { requireAircraft } from './requireAircraft'

/** The sheet of one aircraft: where its channels stand, who works on it, in which states it is judged. */
export function showAircraft({
  aircraftId,
  roles,
}: {
  aircraftId: number
  roles: Role[]
}): Promise<AircraftSheet> {
  return inTransaction(async (tx) => {
    const aircraft = await requireAircraft(tx, aircraftId)
    const channels = await listStandingRecords(tx, [aircraftId])
    return {
      aircraft,
      roles,
      channels: channels.length,
      standings: countStandings(channels),
      people: await listPeople(tx, aircraftId),
      states: await listStates(tx, aircraftId),
    }
  })
}
