import { describe, expect, it } from 'vitest'
import {
  celsiusFromMillivolts,
  emfMillivolts,
  sensitivityMillivoltsPerKelvin,
} from '#shared/thermometry/its90'
import { thermoelementMillivolts } from '#shared/thermometry/thermoelements'

describe('ice-water check, common practice', () => {
  it('tip at 0 °C, terminals at 20 °C, type K: −0.798 mV, and 0 °C with the compensation added', () => {
    const atTerminals = emfMillivolts('K', 0) - emfMillivolts('K', 20)
    expect(atTerminals).toBeCloseTo(-0.798, 3)
    // The printed −0.798 mV is rounded: half a digit is 0.0005 mV / 0.0395 mV/K = 0.013 K.
    expect(Math.abs(celsiusFromMillivolts('K', -0.798 + emfMillivolts('K', 20)))).toBeLessThan(0.013)
  })
})

/** Monograph 175 has the constantan of J (JN) apart from that of E and T (EN): sizes of the error of mistaking them. */
describe('JN is not EN', () => {
  const difference = (celsius: number) =>
    thermoelementMillivolts('JN', celsius) - thermoelementMillivolts('EN', celsius)

  it.each([
    [100, 0.015, 0.0005],
    [600, 0.1, 0.01],
  ])('at %d °C they are %d mV apart', (celsius, millivolts, tolerance) => {
    expect(Math.abs(difference(celsius) - millivolts)).toBeLessThan(tolerance)
  })

  it('which type J shows as about 0.3 K at 100 °C', () => {
    expect(difference(100) / sensitivityMillivoltsPerKelvin('J', 100)).toBeCloseTo(0.28, 1)
  })
})

/**
 * Points of the published tables as they are commonly quoted: boiling water in types K, J and T, and the emf of the
 * public example of a type K input, 12.209 mV at 300 °C.
 */
describe('commonly quoted points', () => {
  it.each([
    ['K', 100, 4.096],
    ['J', 100, 5.269],
    ['T', 100, 4.279],
    ['K', 300, 12.209],
  ] as const)('type %s at %d °C gives %d mV, and back', (type, celsius, millivolts) => {
    expect(emfMillivolts(type, celsius)).toBeCloseTo(millivolts, 3)
    expect(celsiusFromMillivolts(type, millivolts)).toBeCloseTo(celsius, 1)
  })
})
