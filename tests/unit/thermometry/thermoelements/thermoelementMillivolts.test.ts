import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { emfMillivolts, letterTypeRange } from '#shared/thermometry/its90'
import type { Thermoelement } from '#shared/thermometry/thermoelements'
import {
  THERMOELEMENTS,
  legsOf,
  thermoelementInfo,
  thermoelementMillivolts,
  thermoelementSensitivityMillivoltsPerKelvin,
} from '#shared/thermometry/thermoelements'

const STEP = 1e-3

function pair(positive: Thermoelement, negative: Thermoelement, celsius: number): number {
  return thermoelementMillivolts(positive, celsius) - thermoelementMillivolts(negative, celsius)
}

describe.each(THERMOELEMENTS)('thermoelementMillivolts, %s', (element) => {
  const { symbol, lowCelsius, highCelsius } = thermoelementInfo(element)

  it('is zero at 0 °C', () => {
    expect(Math.abs(thermoelementMillivolts(element, 0))).toBeLessThan(1e-5)
  })

  it('holds at both ends of the range it states', () => {
    for (const celsius of [lowCelsius, highCelsius])
      expect(Number.isFinite(thermoelementMillivolts(element, celsius))).toBe(true)
  })

  it.each([lowCelsius - 1e-6, highCelsius + 1e-6])('refuses %d °C and names the conductor', (celsius) => {
    const refusal = expect.objectContaining({
      name: 'OutOfRangeError',
      what: `${symbol} temperature`,
      low: lowCelsius,
      high: highCelsius,
    })
    expect(() => thermoelementMillivolts(element, celsius)).toThrow(refusal)
    expect(() => thermoelementSensitivityMillivoltsPerKelvin(element, celsius)).toThrow(refusal)
  })

  it.each([Number.NaN, Infinity])('refuses %d', (celsius) => {
    const refusal = expect.objectContaining({ name: 'NotANumberError' })
    expect(() => thermoelementMillivolts(element, celsius)).toThrow(refusal)
    expect(() => thermoelementSensitivityMillivoltsPerKelvin(element, celsius)).toThrow(refusal)
  })

  it('has the slope of its emf as sensitivity', () => {
    fc.assert(
      fc.property(fc.double({ min: lowCelsius + STEP, max: highCelsius - STEP, noNaN: true }), (celsius) => {
        // The published slopes of NP and NN jump at 0 °C.
        fc.pre(Math.abs(celsius) > STEP)
        const rise =
          thermoelementMillivolts(element, celsius + STEP) - thermoelementMillivolts(element, celsius - STEP)
        const slope = thermoelementSensitivityMillivoltsPerKelvin(element, celsius)
        expect(Math.abs(rise / (2 * STEP) - slope)).toBeLessThan(2e-6)
      }),
      { numRuns: 300 },
    )
  })
})

/** Letter functions on one side, conductors by way of platinum or of other letters on the other. */
describe('two conductors make their letter type', () => {
  it.each([
    ['J', 1e-6],
    ['N', 1e-6],
    ['B', 1e-6],
  ] as const)('type %s from its single legs', (type, tolerance) => {
    const { positive, negative } = legsOf(type)
    const { lowCelsius, highCelsius } = thermoelementInfo(positive)
    fc.assert(
      fc.property(fc.double({ min: lowCelsius, max: highCelsius, noNaN: true }), (celsius) => {
        const difference = pair(positive, negative, celsius) - emfMillivolts(type, celsius)
        expect(Math.abs(difference)).toBeLessThan(tolerance)
      }),
      { numRuns: 1000 },
    )
  })
})

describe('conductors known by two names', () => {
  it.each([
    ['EP', 'KP'],
    ['EN', 'TN'],
    ['Cu', 'TP'],
    ['SN', 'RN'],
  ] as const)('%s is %s', (one, other) => {
    const { lowCelsius, highCelsius } = thermoelementInfo(one)
    for (const celsius of [lowCelsius, 20, 250, highCelsius]) {
      expect(thermoelementMillivolts(one, celsius)).toBe(thermoelementMillivolts(other, celsius))
      expect(thermoelementSensitivityMillivoltsPerKelvin(one, celsius)).toBe(
        thermoelementSensitivityMillivoltsPerKelvin(other, celsius),
      )
    }
  })
})

describe('the common reference', () => {
  it('is TN, which has no emf against itself', () => {
    const { lowCelsius, highCelsius } = letterTypeRange('E')
    for (const celsius of [lowCelsius, 25, highCelsius])
      expect(thermoelementMillivolts('TN', celsius)).toBe(0)
  })
})

describe('signs and order that the trade knows', () => {
  it('at 100 °C: KP above iron above copper above platinum above KN above the constantans', () => {
    const order: Thermoelement[] = ['KP', 'JP', 'Cu', 'RN', 'KN', 'JN', 'EN']
    const emf = order.map((element) => thermoelementMillivolts(element, 100))
    expect(emf).toEqual([...emf].sort((a, b) => b - a))
  })

  it('iron of the handbook is not the iron of thermocouples', () => {
    expect(pair('iron', 'JP', 100)).toBeCloseTo(0.11, 2)
  })

  it('a copper splice in KN and one in KP pull opposite ways', () => {
    expect(pair('KP', 'Cu', 60)).toBeGreaterThan(0)
    expect(pair('KN', 'Cu', 60)).toBeLessThan(0)
  })
})
