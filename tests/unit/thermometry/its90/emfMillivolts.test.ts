import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { LetterType } from '#shared/thermometry/its90'
import {
  LETTER_TYPES,
  emfMillivolts,
  letterTypeRange,
  sensitivityMillivoltsPerKelvin,
} from '#shared/thermometry/its90'
import { REFERENCE_FUNCTIONS } from '#shared/thermometry/its90/coefficients'
import { pieceMillivolts } from '#shared/thermometry/its90/piece'
import { risingRange } from './ranges'

const RANGES: readonly (readonly [LetterType, number, number])[] = [
  ['B', 0, 1820],
  ['E', -270, 1000],
  ['J', -210, 1200],
  ['K', -270, 1372],
  ['N', -270, 1300],
  ['R', -50, 1768.1],
  ['S', -50, 1768.1],
  ['T', -270, 400],
]

describe('letterTypeRange', () => {
  it.each(RANGES)('type %s holds from %d to %d °C', (type, lowCelsius, highCelsius) => {
    expect(letterTypeRange(type)).toEqual({ lowCelsius, highCelsius })
  })
})

describe.each(RANGES)('emfMillivolts, type %s', (type, low, high) => {
  it('is zero at 0 °C', () => {
    // Type K's exponential leaves 10 nV at the join.
    expect(Math.abs(emfMillivolts(type, 0))).toBeLessThan(1e-5)
  })

  it('holds at both ends of the range and is a number throughout', () => {
    for (const celsius of [low, high]) expect(emfMillivolts(type, celsius)).not.toBeNaN()
  })

  it.each([low - 1e-6, high + 1e-6])('refuses %d °C and names the type and the range', (celsius) => {
    expect(() => emfMillivolts(type, celsius)).toThrow(
      expect.objectContaining({
        name: 'OutOfRangeError',
        what: `type ${type} temperature`,
        low,
        high,
        unit: '°C',
      }),
    )
  })

  it.each([Number.NaN, Infinity, -Infinity])('refuses %d', (celsius) => {
    expect(() => emfMillivolts(type, celsius)).toThrow(expect.objectContaining({ name: 'NotANumberError' }))
  })

  it('is continuous where its pieces join', () => {
    const { direct } = REFERENCE_FUNCTIONS[type]
    direct.slice(1).forEach((upper, i) => {
      const lower = direct[i]
      if (!lower) throw new Error('a piece without one below it')
      expect(lower.highCelsius).toBe(upper.lowCelsius)
      const step = pieceMillivolts(upper, upper.lowCelsius) - pieceMillivolts(lower, upper.lowCelsius)
      expect(Math.abs(step)).toBeLessThan(1e-6)
    })
  })

  it('rises throughout, type B above its turning point', () => {
    const range = risingRange(type)
    fc.assert(
      fc.property(
        fc.double({ min: range.low, max: range.high, noNaN: true }),
        fc.double({ min: range.low, max: range.high, noNaN: true }),
        (a, b) => {
          fc.pre(Math.abs(a - b) > 1e-6)
          expect(emfMillivolts(type, Math.max(a, b))).toBeGreaterThan(emfMillivolts(type, Math.min(a, b)))
        },
      ),
      { numRuns: 1000 },
    )
  })
})

describe('type B near room temperature', () => {
  it('falls to its least emf near 21 °C and is back at zero near 42 °C', () => {
    expect(emfMillivolts('B', 21)).toBeCloseTo(-0.0026, 4)
    expect(sensitivityMillivoltsPerKelvin('B', 20)).toBeLessThan(0)
    expect(sensitivityMillivoltsPerKelvin('B', 22)).toBeGreaterThan(0)
    expect(emfMillivolts('B', 42)).toBeLessThan(0)
    expect(emfMillivolts('B', 42.3)).toBeGreaterThan(0)
  })
})

describe('every type', () => {
  it('has a range', () => {
    expect(RANGES.map(([type]) => type)).toEqual([...LETTER_TYPES])
  })
})
