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

type FoundCodes = Pick<ExpectedReading, 'findingCodes'>

/** Every code found in any of the states, once. */
function findingCodesOf(readings: readonly FoundCodes[]): FindingCode[] {
  return [...new Set(readings.flatMap((reading) => reading.findingCodes))]
}

/** What of a channel and its records decides where it stands. */
export interface StandingParts {
  channel: Pick<Channel, 'sensor' | 'displayId'>
  hasProbe: boolean
  hasRun: boolean
  readings: readonly FoundCodes[]
}

/** Where a channel stands, from its records and its stored readings. */
export function standingOf({ channel, hasProbe, hasRun, readings }: StandingParts): ChannelStanding {
  const { sensor, displayId } = channel
  return channelStanding({ sensor, displayId, hasProbe, hasRun, findingCodes: findingCodesOf(readings) })
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
