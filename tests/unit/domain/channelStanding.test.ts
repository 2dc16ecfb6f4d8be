import { describe, expect, it } from 'vitest'
import type { StandingFacts } from '#shared/domain/channelStanding'
import { channelStanding } from '#shared/domain/channelStanding'
import type { ChannelStanding } from '#shared/types/workbook'

const wired: StandingFacts = {
  sensor: 'thermocouple',
  displayId: 1,
  hasProbe: true,
  hasRun: true,
  findingCodes: [],
}

describe('where a channel stands', () => {
  it.each<[string, Partial<StandingFacts>, ChannelStanding]>([
    ['wired without a finding', {}, 'as-intended'],
    ['wired, its probe not logged', { hasProbe: false }, 'as-intended'],
    ['a metal that adds nothing', { findingCodes: ['harmless-metal'] }, 'as-intended'],
    ['one real finding among harmless ones', { findingCodes: ['harmless-metal', 'off-scale'] }, 'faults'],
    ['a stray junction', { findingCodes: ['stray-junction'] }, 'faults'],
    ['a probe but no run', { hasRun: false }, 'no-run'],
    ['a run but no display', { displayId: null }, 'no-display'],
    ['a probe, neither display nor run', { displayId: null, hasRun: false }, 'no-display'],
    ['nothing logged yet', { hasProbe: false, hasRun: false }, 'planned'],
    ['nothing logged, no display', { hasProbe: false, hasRun: false, displayId: null }, 'planned'],
    ['another kind of sensor', { sensor: 'pulse' }, 'record-only'],
  ])('%s', (_case, changes, standing) => {
    expect(channelStanding({ ...wired, ...changes })).toBe(standing)
  })
})
