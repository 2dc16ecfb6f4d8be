import { aircraftChain } from '~~/server/audit'
import type { Transaction } from '~~/server/db/client'
import { listEntityEvents } from '~~/server/repositories/auditEvents'

/**
 * The version a probe or a run of a channel begins with. One that is logged again goes on counting where the removed
 * one ended: otherwise a page opened before the removal would hold a version that fits, and overwrite it unseen.
 */
export async function firstVersion(
  tx: Transaction,
  aircraftId: number,
  entity: 'probe' | 'run',
  channelId: number,
): Promise<number> {
  const [latest] = await listEntityEvents(tx, aircraftChain(aircraftId), entity, channelId)
  const last = (latest?.after ?? latest?.before)?.version
  return typeof last === 'number' ? last + 1 : 1
}
