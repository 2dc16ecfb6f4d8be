import type { ChannelStanding } from '#shared/types/workbook'
import { CHANNEL_STANDINGS } from '#shared/types/workbook'
import type { StandingParts } from '../channels/channelRow'
import { standingOf } from '../channels/channelRow'

/** How many channels stand where, with a nought where there is none. */
export function countStandings(channels: readonly StandingParts[]): Record<ChannelStanding, number> {
  const counts = Object.fromEntries(CHANNEL_STANDINGS.map((standing) => [standing, 0])) as Record<
    ChannelStanding,
    number
  >
  for (const channel of channels) counts[standingOf(channel)] += 1
  return counts
}
