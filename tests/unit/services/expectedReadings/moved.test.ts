import { describe, expect, it } from 'vitest'
import { movedChannels } from '~~/server/services/expectedReadings/moved'
import { channelRecord, readingRecord } from '../../../factories/channels'

const channels = [channelRecord(), channelRecord({ id: 2, tag: 'EGT 2' })]
const shows = (channelId: number, celsius: number, stateId = 1) =>
  readingRecord({ channelId, stateId, indication: { kind: 'value', celsius } })

describe('channels that moved', () => {
  it('are those that show something else, from what to what', () => {
    const moved = movedChannels(1, channels, [shows(1, 700), shows(2, 710)], [shows(1, 700), shows(2, 704.5)])
    expect(moved).toEqual([{ channelId: 2, tag: 'EGT 2', beforeCelsius: 710, afterCelsius: 704.5 }])
  })

  it('stay out when nothing moved', () => {
    expect(movedChannels(1, channels, [shows(1, 700)], [shows(1, 700)])).toEqual([])
  })

  it('are judged in the state asked for alone', () => {
    expect(movedChannels(1, channels, [shows(1, 700, 2)], [shows(1, 650, 2)])).toEqual([])
  })

  it('have no number where the reading left the scale or came to be', () => {
    const offScale = readingRecord({ indication: { kind: 'off-scale-high', limitCelsius: 900 } })
    expect(movedChannels(1, channels, [shows(1, 890)], [offScale, shows(2, 20)])).toEqual([
      { channelId: 1, tag: 'EGT 1', beforeCelsius: 890, afterCelsius: null },
      { channelId: 2, tag: 'EGT 2', beforeCelsius: null, afterCelsius: 20 },
    ])
  })
})
