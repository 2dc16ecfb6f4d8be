import { createHash } from 'node:crypto'

/** What the first event of a chain follows. */
export const FIRST_PREVIOUS_HASH = '0'.repeat(64)

/** Everything an event's hash vouches for. */
export interface HashedEvent {
  chain: string
  sequence: number
  at: Date
  actorId: number | null
  action: string
  entity: string
  entityId: number | null
  before: unknown
  after: unknown
  previousHash: string
}

/** Hash of an event, 64 hexadecimal digits: SHA-256 of its canonical JSON, the previous event's hash within it. */
export function hashEvent(event: HashedEvent): string {
  const { chain, sequence, at, actorId, action, entity, entityId, before, after, previousHash } = event
  const content = { chain, sequence, at, actorId, action, entity, entityId, before, after, previousHash }
  return createHash('sha256').update(canonicalJson(content)).digest('hex')
}

/** JSON in which the order of the keys, and what JSON drops or rewrites, can make no difference. */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(sorted(JSON.parse(JSON.stringify(value))))
}

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted)
  if (value === null || typeof value !== 'object') return value
  const entries = Object.entries(value).map(([key, inner]) => [key, sorted(inner)] as const)
  return Object.fromEntries(entries.sort(([a], [b]) => (a < b ? -1 : 1)))
}
