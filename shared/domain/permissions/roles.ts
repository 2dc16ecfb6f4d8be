/** The four roles a person can hold on an aircraft; one person may hold several. */
export const ROLES = ['owner', 'builder', 'inspector', 'mentor'] as const
export type Role = (typeof ROLES)[number]
