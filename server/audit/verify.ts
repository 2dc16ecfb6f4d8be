import type { Executor } from '~~/server/db/client'
import type { StoredAuditEvent } from '~~/server/repositories/auditEvents'
import { readChain, readChainHead } from '~~/server/repositories/auditEvents'
import type { AuditChain } from './actions'
import { FIRST_PREVIOUS_HASH, hashEvent } from './hash'

const AT_A_TIME = 500

export type ChainVerdict =
  | { intact: true; events: number }
  /** The first event that cannot be trusted, and why. */
  | { intact: false; sequence: number; reason: string }

/** Reads a chain from its start and says whether every event is there, in its place and as it was written. */
export async function verifyAuditChain(db: Executor, chain: AuditChain): Promise<ChainVerdict> {
  // The end first: what is added while we read does not count as missing.
  const head = (await readChainHead(db, chain)) ?? { sequence: 0, hash: FIRST_PREVIOUS_HASH }
  let last = { sequence: 0, hash: FIRST_PREVIOUS_HASH }
  while (last.sequence < head.sequence) {
    const events = await readChain(db, chain, last.sequence, AT_A_TIME)
    if (events.length === 0) return broken(last.sequence + 1, 'The event is missing.')
    for (const event of events) {
      const fault = faultOf(event, last)
      if (fault) return fault
      last = event
      if (last.sequence === head.sequence) break
    }
  }
  if (last.hash !== head.hash) return broken(head.sequence, 'The end of the chain is not the one recorded.')
  return { intact: true, events: head.sequence }
}

function faultOf(
  event: StoredAuditEvent,
  last: { sequence: number; hash: string },
): ChainVerdict | undefined {
  if (event.sequence !== last.sequence + 1) return broken(last.sequence + 1, 'The event is missing.')
  if (event.previousHash !== last.hash)
    return broken(event.sequence, 'It does not follow the event before it.')
  if (event.hash !== hashEvent(event)) return broken(event.sequence, 'Its content is not what was written.')
  return undefined
}

function broken(sequence: number, reason: string): ChainVerdict {
  return { intact: false, sequence, reason }
}
