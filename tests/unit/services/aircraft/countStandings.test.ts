import { describe, expect, it } from 'vitest'
import { countStandings } from '~~/server/services/aircraft/countStandings'
import { channelRecord, readingRecord } from '../../../factories/channels'

const wired = { channel: channelRecord(), hasProbe: true, hasRun: true, readings: [readingRecord()] }

describe('channels by standing', () => {
  it('name every standing, also those where there is none', () => {
    expect(countStandings([])).toEqual({
      planned: 0,
      'no-display': 0,
      'no-run': 0,
      faults: 0,
      'as-intended': 0,
      'record-only': 0,
    })
  })

  it('add up to the channels', () => {
    const faulty = { ...wired, readings: [readingRecord({ findingCodes: ['off-scale'] })] }
    const counts = countStandings([wired, faulty, wired, { ...wired, hasRun: false, readings: [] }])
    expect(counts).toMatchObject({ 'as-intended': 2, faults: 1, 'no-run': 1 })
    expect(Object.values(counts).reduce((sum, count) => sum + count)).toBe(4)
  })
})
