import type { ChannelStanding } from '#shared/types/workbook'

/** The mark that stands beside a channel's standing. */
export function standingStatus(standing: ChannelStanding): 'good' | 'open' | 'trouble' | 'record' {
  if (standing === 'faults') return 'trouble'
  if (standing === 'as-intended') return 'good'
  return standing === 'record-only' ? 'record' : 'open'
}
