import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { PLATINUM_LEGS, emfAgainstPlatinum67, platinumLegRange } from '#shared/thermometry/thermoelements'
import { sensitivityAgainstPlatinum67 } from '#shared/thermometry/thermoelements/emfAgainstPlatinum67'

const STEP = 1e-3

describe('platinumLegRange', () => {
  it.each([
    ['KP', -270, 1372],
    ['KN', -270, 1372],
    ['EN', -270, 1000],
    ['TP', -270, 400],
    ['JP', -210, 760],
    ['JN', -210, 760],
    ['NP', -270, 1300],
    ['NN', -270, 1300],
    ['BP', 0, 1768.1],
    ['BN', 0, 1768.1],
  ] as const)('%s holds from %d to %d °C', (leg, lowCelsius, highCelsius) => {
    expect(platinumLegRange(leg)).toEqual({ lowCelsius, highCelsius })
  })
})

describe.each(PLATINUM_LEGS)('emfAgainstPlatinum67, %s', (leg) => {
  const { lowCelsius, highCelsius } = platinumLegRange(leg)

  it('is zero at 0 °C', () => {
    expect(Math.abs(emfAgainstPlatinum67(leg, 0))).toBeLessThan(1e-5)
  })

  it('has the slope of its emf as sensitivity', () => {
    fc.assert(
      fc.property(fc.double({ min: lowCelsius + STEP, max: highCelsius - STEP, noNaN: true }), (celsius) => {
        // The published slopes of NP and NN jump at 0 °C.
        fc.pre(Math.abs(celsius) > STEP)
        const rise = emfAgainstPlatinum67(leg, celsius + STEP) - emfAgainstPlatinum67(leg, celsius - STEP)
        const slope = sensitivityAgainstPlatinum67(leg, celsius)
        expect(Math.abs(rise / (2 * STEP) - slope)).toBeLessThan(2e-6)
      }),
      { numRuns: 500 },
    )
  })

  it.each([lowCelsius - 1e-6, highCelsius + 1e-6, Number.NaN])('refuses %d °C', (celsius) => {
    const refusal = expect.objectContaining({ what: `${leg} temperature` })
    expect(() => emfAgainstPlatinum67(leg, celsius)).toThrow(refusal)
    expect(() => sensitivityAgainstPlatinum67(leg, celsius)).toThrow(refusal)
  })
})
