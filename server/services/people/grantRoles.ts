import type { Role } from '#shared/domain/permissions'
import { addMemberships } from '~~/server/repositories/memberships'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite } from '../aircraft/recordWrite'

/** Gives a person roles on an aircraft. */
export function grantRoles(scope: AircraftScope, userId: number, roles: readonly Role[]): Promise<void> {
  return changeAircraft(scope, async (tx) => {
    await addMemberships(tx, scope.aircraftId, userId, roles)
    await recordWrite(tx, scope, {
      action: 'membership.granted',
      entityId: userId,
      before: null,
      after: { userId, roles },
    })
  })
}
