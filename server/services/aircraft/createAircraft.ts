import type { Role } from '#shared/domain/permissions'
import type { CreateAircraftInput } from '#shared/schemas/aircraft'
import type { Account } from '#shared/types/account'
import type { Aircraft } from '#shared/types/workbook'
import type { Transaction } from '~~/server/db/client'
import { inTransaction } from '~~/server/db/client'
import { insertAircraft } from '~~/server/repositories/aircraft'
import { addMemberships } from '~~/server/repositories/memberships'
import { layOutOrRefuse, storeLayOut } from './layOut'
import { recordWrite } from './recordWrite'
import { requireAircraft } from './requireAircraft'

/** Somebody who starts a project owns it, and as a rule builds it. */
const CREATOR_ROLES: readonly Role[] = ['owner', 'builder']

/** Starts a project: its zones, states, temperatures, display and channels are laid out from the engine. */
export function createAircraft(
  account: Pick<Account, 'id'>,
  input: CreateAircraftInput,
  within?: Transaction,
): Promise<{ aircraft: Aircraft }> {
  const layOut = layOutOrRefuse(input.layout)
  const { name, registration, cableStandard, layout } = input
  const create = async (tx: Transaction) => {
    const values = { name, registration, cableStandard, layout }
    const aircraftId = await insertAircraft(tx, values, account.id)
    await addMemberships(tx, aircraftId, account.id, CREATOR_ROLES)
    await storeLayOut(tx, aircraftId, layOut, input)
    const aircraft = await requireAircraft(tx, aircraftId)
    await recordWrite(
      tx,
      { account, aircraftId },
      {
        action: 'aircraft.created',
        entityId: aircraftId,
        before: null,
        after: {
          ...aircraft,
          roles: CREATOR_ROLES,
          display: input.displayName,
          zones: layOut.zones.map((zone) => zone.name),
          states: layOut.states.map((state) => state.name),
          channels: layOut.channels.map((channel) => channel.tag),
        },
      },
    )
    return { aircraft }
  }
  return within ? create(within) : inTransaction(create)
}
