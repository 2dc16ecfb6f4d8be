/** Everything that leaves a trace, by the record it happens to. */
export const AUDIT_ACTIONS = [
  'account.registered',
  'account.password-changed',
  'account.preferences-changed',
  'aircraft.created',
  'aircraft.updated',
  'aircraft.archived',
  'aircraft.restored',
  'aircraft.deleted',
  'membership.granted',
  'zone.created',
  'zone.updated',
  'zone.deleted',
  'state.created',
  'state.updated',
  'state.deleted',
  'temperature.set',
  'display.created',
  'display.updated',
  'display.deleted',
  'channel.created',
  'channel.updated',
  'channel.deleted',
  'probe.logged',
  'probe.removed',
  'run.saved',
  'run.removed',
] as const
export type AuditAction = (typeof AUDIT_ACTIONS)[number]

/** What an action happens to: the part before its dot. */
export type AuditEntity = AuditAction extends `${infer Entity}.${string}` ? Entity : never

/** Events of one aircraft, or of one account, follow each other in one chain. */
export type AuditChain = `aircraft:${number}` | `account:${number}`

export function aircraftChain(aircraftId: number): AuditChain {
  return `aircraft:${aircraftId}`
}

export function accountChain(accountId: number): AuditChain {
  return `account:${accountId}`
}

/** A record as it stood, in the shape the API returns it. Never with a secret in it. */
export type AuditSnapshot = object

export interface AuditEntry {
  chain: AuditChain
  actorId: number | null
  action: AuditAction
  /** Key of the record; for a zone's temperature the zone's. */
  entityId: number
  /** Null for what is new. */
  before: AuditSnapshot | null
  /** Null for what is gone. */
  after: AuditSnapshot | null
}
