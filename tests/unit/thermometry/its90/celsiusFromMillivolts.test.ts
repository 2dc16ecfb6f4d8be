import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  LETTER_TYPES,
  celsiusFromMillivolts,
  emfMillivolts,
  inverseRange,
  letterTypeRange,
} from '#shared/thermometry/its90'
import { REFERENCE_FUNCTIONS } from '#shared/thermometry/its90/coefficients'
import { risingRange } from './ranges'

const ROUND_TRIP_CELSIUS = 1e-6
const CASES = { numRuns: 2000 }

describe.each(LETTER_TYPES)('celsiusFromMillivolts, type %s', (type) => {
  const range = inverseRange(type)
  const { low, high } = risingRange(type)

  it('returns the temperature of which the emf was taken', () => {
    fc.assert(
      fc.property(fc.double({ min: low, max: high, noNaN: true }), (celsius) => {
        const back = celsiusFromMillivolts(type, emfMillivolts(type, celsius))
        expect(Math.abs(back - celsius)).toBeLessThanOrEqual(ROUND_TRIP_CELSIUS)
      }),
      CASES,
    )
  })

  it('returns a temperature of which the emf is the one given', () => {
    const lowest = type === 'B' ? emfMillivolts(type, low) : range.lowMillivolts
    fc.assert(
      fc.property(fc.double({ min: lowest, max: range.highMillivolts, noNaN: true }), (millivolts) => {
        const back = emfMillivolts(type, celsiusFromMillivolts(type, millivolts))
        // Type K's pieces leave a gap of 2 pV at 0 °C, which no temperature fills.
        expect(Math.abs(back - millivolts)).toBeLessThan(5e-9)
      }),
      CASES,
    )
  })

  it('does not depend on which published inverse gave the first guess', () => {
    const joins = REFERENCE_FUNCTIONS[type].inverse.flatMap(({ lowMillivolts, highMillivolts }) => [
      lowMillivolts,
      highMillivolts,
    ])
    for (const join of joins) {
      const [below, at, above] = [join - 1e-9, join, join + 1e-9].map((millivolts) =>
        Math.min(Math.max(millivolts, range.lowMillivolts), range.highMillivolts),
      )
      if (below === undefined || at === undefined || above === undefined) throw new Error('three were given')
      const celsius = celsiusFromMillivolts(type, at)
      expect(Math.abs(celsiusFromMillivolts(type, below) - celsius)).toBeLessThan(ROUND_TRIP_CELSIUS)
      expect(Math.abs(celsiusFromMillivolts(type, above) - celsius)).toBeLessThan(ROUND_TRIP_CELSIUS)
    }
  })

  it('turns the emf of every end and join back', () => {
    const ends = REFERENCE_FUNCTIONS[type].direct.flatMap(({ lowCelsius, highCelsius }) => [
      lowCelsius,
      highCelsius,
    ])
    for (const celsius of ends.filter((end) => end >= low))
      expect(Math.abs(celsiusFromMillivolts(type, emfMillivolts(type, celsius)) - celsius)).toBeLessThan(
        ROUND_TRIP_CELSIUS,
      )
  })

  it('refuses an emf above its range and names the range', () => {
    const above = range.highMillivolts + 1e-6
    expect(() => celsiusFromMillivolts(type, above)).toThrow(
      expect.objectContaining({
        name: 'OutOfRangeError',
        what: `type ${type} emf`,
        value: above,
        low: range.lowMillivolts,
        high: range.highMillivolts,
        unit: 'mV',
      }),
    )
  })

  it('refuses an emf below its range', () => {
    expect(() => celsiusFromMillivolts(type, range.lowMillivolts - 1e-6)).toThrow(
      expect.objectContaining({ name: 'OutOfRangeError' }),
    )
  })

  it.each([Number.NaN, Infinity, -Infinity])('refuses %d', (millivolts) => {
    expect(() => celsiusFromMillivolts(type, millivolts)).toThrow(
      expect.objectContaining({ name: 'NotANumberError', what: `type ${type} emf` }),
    )
  })
})

describe('below the published inverse functions', () => {
  it.each([
    ['E', -269, -9.833],
    ['K', -250, -6.404],
    ['N', -250, -4.313],
    ['T', -260, -6.232],
  ] as const)('type %s, %d °C from %d mV of the printed table', (type, celsius, millivolts) => {
    // The printed figure is rounded, and the emf hardly moves down there: half a digit is up to 0.3 K.
    expect(Math.abs(celsiusFromMillivolts(type, millivolts) - celsius)).toBeLessThan(0.35)
  })
})

describe('inverseRange', () => {
  it.each(LETTER_TYPES.filter((type) => type !== 'B'))('of type %s is the whole range', (type) => {
    expect(inverseRange(type)).toMatchObject(letterTypeRange(type))
  })

  it('of type B begins where its emf becomes positive', () => {
    expect(inverseRange('B')).toMatchObject({ lowCelsius: 42, lowMillivolts: 0, highCelsius: 1820 })
  })
})

describe('type B', () => {
  it.each([0, -0.001, -0.0025])(
    'refuses %d mV, and says that two temperatures give one emf',
    (millivolts) => {
      expect(() => celsiusFromMillivolts('B', millivolts)).toThrow(
        expect.objectContaining({ name: 'OutOfRangeError' }),
      )
      expect(() => celsiusFromMillivolts('B', millivolts)).toThrow('two temperatures for one emf')
    },
  )

  it('keeps that reason to itself where the emf is too high', () => {
    expect(() => celsiusFromMillivolts('B', 14)).toThrow(/13\.8203 mV\.$/)
  })

  it('takes the rising branch for any positive emf', () => {
    for (const millivolts of [1e-9, 1e-5, 0.001, 0.006]) {
      const celsius = celsiusFromMillivolts('B', millivolts)
      expect(celsius).toBeGreaterThan(42)
      expect(emfMillivolts('B', celsius)).toBeCloseTo(millivolts, 9)
    }
  })
})
