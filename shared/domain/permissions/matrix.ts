import type { Role } from './roles'

/**
 * Who may do what on an aircraft. Someone without any role on it is an outsider: for them it does not exist.
 * Conditions beyond the role (never signing one's own work, drafts for builders) stand with their use case.
 */
export const PERMISSIONS = {
  'aircraft:see': ['owner', 'builder', 'inspector', 'mentor'],
  'aircraft:edit': ['owner', 'builder'],
  'work:log': ['owner', 'builder'],
  'squawk:raise': ['owner', 'builder', 'inspector', 'mentor'],
  'checklist:answer': ['inspector'],
  'channel:sign-off': ['inspector'],
  'channel:remark': ['owner', 'builder', 'inspector', 'mentor'],
  'channel:give-opinion': ['mentor'],
  'people:manage': ['owner'],
  'report:export': ['owner', 'builder'],
  'aircraft:administer': ['owner'],
} as const satisfies Record<string, readonly Role[]>

export type Permission = keyof typeof PERMISSIONS

/** True when any of the roles held carries the permission. */
export function may(roles: readonly Role[], permission: Permission): boolean {
  const holders: readonly Role[] = PERMISSIONS[permission]
  return roles.some((role) => holders.includes(role))
}
