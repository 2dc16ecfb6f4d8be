import type { FindingCode } from '../thermometry/run'
import type { Channel, ChannelStanding } from '../types/workbook'

/** What of a channel's records decides where it stands. */
export interface StandingFacts {
  sensor: Channel['sensor']
  displayId: number | null
  hasProbe: boolean
  hasRun: boolean
  /** Codes found in any operating state. */
  findingCodes: readonly FindingCode[]
}

/** A foreign metal between equal temperatures adds nothing to the reading, so it is no fault. */
const HARMLESS: readonly FindingCode[] = ['harmless-metal']

/**
 * Where a channel stands: the first thing still missing, or what the solver found.
 * Channels that are no thermocouples are recorded without being solved.
 */
export function channelStanding(facts: StandingFacts): ChannelStanding {
  if (facts.sensor !== 'thermocouple') return 'record-only'
  if (!facts.hasProbe && !facts.hasRun) return 'planned'
  if (facts.displayId === null) return 'no-display'
  if (!facts.hasRun) return 'no-run'
  return facts.findingCodes.some((code) => !HARMLESS.includes(code)) ? 'faults' : 'as-intended'
}
