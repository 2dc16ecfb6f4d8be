import type { Channel } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { notFound } from '~~/server/http/appError'
import { findChannel } from '~~/server/repositories/channels'

/** A channel of this aircraft, or 404. */
export async function requireChannel(
  executor: Executor,
  aircraftId: number,
  channelId: number,
): Promise<Channel> {
  const channel = await findChannel(executor, aircraftId, channelId)
  if (!channel) throw notFound('channel')
  return channel
}

/** What is said when another channel has the tag already. */
export function tagTaken(tag: string) {
  return { field: 'tag', reason: `There is a channel tagged "${tag}" already.` }
}

/** A channel as the subject of a versioned write. */
export function channelSubject({ id, tag }: Channel) {
  return { entity: 'channel', entityId: id, called: `channel ${tag}` } as const
}
