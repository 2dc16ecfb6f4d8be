import { QUANTITY_WORDS } from '#shared/domain/wording'
import type { ChannelSheet } from '#shared/types/workbook'

/** The rows of a channel sheet's title block. */
export function channelTitleBlock({ aircraft, channel, run }: ChannelSheet) {
  return [
    { label: 'Tag', value: channel.tag },
    { label: 'Aircraft', value: aircraft.registration || aircraft.name },
    { label: 'Title', value: QUANTITY_WORDS[channel.quantity], wide: true },
    { label: 'Channel revision', value: String(channel.version) },
    { label: 'Run revision', value: run ? String(run.version) : 'no run' },
    { label: 'Drawn', value: run ? run.savedAt.slice(0, 10) : 'not yet' },
    { label: 'Checked', value: 'no check recorded' },
    { label: 'Signed', value: 'not signed', wide: true },
  ]
}
