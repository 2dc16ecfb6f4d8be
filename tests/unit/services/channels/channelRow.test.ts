import { describe, expect, it } from 'vitest'
import { toChannelRow } from '~~/server/services/channels/channelRow'
import { channelRecord, readingRecord } from '../../../factories/channels'

const parts = { channel: channelRecord(), displayName: 'Engine monitor', hasProbe: true, hasRun: true }

describe('a line of the channel table', () => {
  it('carries the largest error of any state, whichever its sign', () => {
    const readings = [2, -43, 7].map((errorKelvin, index) => readingRecord({ stateId: index, errorKelvin }))
    expect(toChannelRow({ ...parts, readings }).worstErrorKelvin).toBe(43)
  })

  it('has no worst error when no state has a number', () => {
    const readings = [readingRecord({ errorKelvin: null })]
    expect(toChannelRow({ ...parts, readings }).worstErrorKelvin).toBeNull()
    expect(toChannelRow({ ...parts, readings: [] }).worstErrorKelvin).toBeNull()
  })

  it('names each finding of any state once, and stands at faults', () => {
    const readings = [
      readingRecord({ findingCodes: ['stray-junction', 'wrong-conductor'] }),
      readingRecord({ stateId: 2, findingCodes: ['off-scale', 'stray-junction'] }),
    ]
    const row = toChannelRow({ ...parts, readings })
    expect(row.findingCodes).toEqual(['stray-junction', 'wrong-conductor', 'off-scale'])
    expect(row.standing).toBe('faults')
  })

  it('stands as intended without findings', () => {
    expect(toChannelRow({ ...parts, readings: [readingRecord()] }).standing).toBe('as-intended')
  })
})
