import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  LETTER_TYPES,
  emfMillivolts,
  letterTypeRange,
  sensitivityMillivoltsPerKelvin,
} from '#shared/thermometry/its90'
import { isAtJoin, risingRange } from './ranges'

const STEP = 1e-3

describe.each(LETTER_TYPES)('sensitivityMillivoltsPerKelvin, type %s', (type) => {
  const { lowCelsius, highCelsius } = letterTypeRange(type)

  it('is the slope of the emf', () => {
    fc.assert(
      fc.property(fc.double({ min: lowCelsius + STEP, max: highCelsius - STEP, noNaN: true }), (celsius) => {
        fc.pre(!isAtJoin(type, celsius, STEP))
        const rise = emfMillivolts(type, celsius + STEP) - emfMillivolts(type, celsius - STEP)
        const slope = sensitivityMillivoltsPerKelvin(type, celsius)
        expect(Math.abs(rise / (2 * STEP) - slope)).toBeLessThan(1e-6)
      }),
      { numRuns: 1000 },
    )
  })

  it('is positive wherever the emf is to be turned back into a temperature', () => {
    const { low, high } = risingRange(type)
    for (let i = 0; i <= 2000; i++)
      expect(sensitivityMillivoltsPerKelvin(type, low + ((high - low) * i) / 2000)).toBeGreaterThan(0)
  })

  it.each([lowCelsius - 1e-6, highCelsius + 1e-6])('refuses %d °C', (celsius) => {
    expect(() => sensitivityMillivoltsPerKelvin(type, celsius)).toThrow(
      expect.objectContaining({ name: 'OutOfRangeError', what: `type ${type} temperature` }),
    )
  })

  it.each([Number.NaN, Infinity])('refuses %d', (celsius) => {
    expect(() => sensitivityMillivoltsPerKelvin(type, celsius)).toThrow(
      expect.objectContaining({ name: 'NotANumberError' }),
    )
  })
})
