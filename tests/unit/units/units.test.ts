import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  differenceFigure,
  figureText,
  formatNumber,
  formatSigned,
  fromCelsius,
  fromKelvin,
  gaugeFigure,
  lengthFigure,
  microvoltFigure,
  millivoltFigure,
  parseNumber,
  squareMillimetresFromAwg,
  temperatureFigure,
  toCelsius,
  toKelvin,
  toMetres,
} from '#shared/units'

describe('numbers', () => {
  it('carry a true minus sign and never a negative zero', () => {
    expect(formatNumber(-12.345, 2)).toBe('−12.35')
    expect(formatNumber(-0.001, 2)).toBe('0.00')
    expect(formatSigned(0.001, 2)).toBe('0.00')
    expect(formatSigned(1.5, 1)).toBe('+1.5')
  })

  it.each([
    ['12,5', 12.5],
    [' 1 250.5 ', 1250.5],
    ['−3', -3],
    ['+.5', 0.5],
  ])('are read as people write them: %s', (text, value) => {
    expect(parseNumber(text)).toBe(value)
  })

  it.each(['', '-', '1.2.3', '12abc', 'NaN', '1e5'])('refuse %j', (text) => {
    expect(parseNumber(text)).toBeNull()
  })

  it('survive being shown and read again', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1_000_000, max: 1_000_000 }), (thousandths) => {
        const value = thousandths / 1000
        expect(parseNumber(formatNumber(value, 3))).toBeCloseTo(value, 9)
      }),
    )
  })
})

describe('temperatures', () => {
  it('convert with the 32° offset, differences without', () => {
    expect(fromCelsius(100, 'fahrenheit')).toBe(212)
    expect(fromCelsius(-40, 'fahrenheit')).toBe(-40)
    expect(fromKelvin(10, 'fahrenheit')).toBe(18)
    expect(figureText(temperatureFigure(20, 'fahrenheit'))).toBe('68.0\u00a0°F')
    expect(figureText(differenceFigure(-10, 'fahrenheit'))).toBe('−18.0\u00a0°F')
  })

  it('come back from °F, temperatures and differences', () => {
    fc.assert(
      fc.property(fc.double({ min: -273, max: 3000, noNaN: true }), (celsius) => {
        expect(toCelsius(fromCelsius(celsius, 'fahrenheit'), 'fahrenheit')).toBeCloseTo(celsius, 9)
        expect(toKelvin(fromKelvin(celsius, 'fahrenheit'), 'fahrenheit')).toBeCloseTo(celsius, 9)
      }),
    )
  })
})

describe('the other figures', () => {
  it('set decimals by what is measured', () => {
    expect(figureText(millivoltFigure(12.2094))).toBe('12.209\u00a0mV')
    expect(figureText(microvoltFigure(-1233.4))).toBe('−1233\u00a0µV')
    expect(figureText(lengthFigure(3.048, 'foot'))).toBe('10.00\u00a0ft')
    expect(toMetres(10, 'foot')).toBeCloseTo(3.048, 12)
  })

  /** Diameters and areas as printed in ASTM B258 (AWG 20: 0.0320 in, AWG 24: 0.0201 in), from memory. */
  it('give the area of a wire gauge', () => {
    expect(squareMillimetresFromAwg(20)).toBeCloseTo(0.518, 3)
    expect(squareMillimetresFromAwg(24)).toBeCloseTo(0.205, 3)
    expect(figureText(gaugeFigure(20, 'awg'))).toBe('20\u00a0AWG')
    expect(figureText(gaugeFigure(20, 'square-millimetre'))).toBe('0.518\u00a0mm²')
  })
})
