import { channelStanding } from '#shared/domain/channelStanding'
import type { FindingCode } from '#shared/thermometry/run'
import type { Channel, ChannelRow, ChannelStanding, ExpectedReading } from '#shared/types/workbook'

export interface ChannelRowParts {
  channel: Channel
  displayName: string | null
  hasProbe: boolean
  hasRun: boolean
  readings: ExpectedReading[]
}

/** Every code found in any of the states, once. */
export function findingCodesOf(readings: readonly ExpectedReading[]): FindingCode[] {
  return [...new Set(readings.flatMap((reading) => reading.findingCodes))]
}

/** Where a channel stands, from its records and its stored readings. */
export function standingOf(parts: Omit<ChannelRowParts, 'displayName'>): ChannelStanding {
  const { sensor, displayId } = parts.channel
  const findingCodes = findingCodesOf(parts.readings)
  return channelStanding({ sensor, displayId, hasProbe: parts.hasProbe, hasRun: parts.hasRun, findingCodes })
}

/** Largest |error| over the states, kelvin; null when none of them has a number. */
function worstErrorKelvin(readings: readonly ExpectedReading[]): number | null {
  const sizes = readings.flatMap(({ errorKelvin }) => (errorKelvin === null ? [] : [Math.abs(errorKelvin)]))
  return sizes.length > 0 ? Math.max(...sizes) : null
}

/** One line of the channel table. */
export function toChannelRow(parts: ChannelRowParts): ChannelRow {
  return {
    ...parts,
    standing: standingOf(parts),
    worstErrorKelvin: worstErrorKelvin(parts.readings),
    findingCodes: findingCodesOf(parts.readings),
  }
}
