import { describe, expect, it } from 'vitest'
import { LETTER_TABLES, parseLetterTables } from './published/letterTables'

const TEXT = `
 ITS-90 Table for type K thermocouple
 °C      0     -1     -2     -3
 -10 -0.392 -0.431 -0.470
   0  0.000 -0.039 -0.079 -0.118
 °C      0      1      2      3
   0  0.000  0.039  0.079  0.119
name: reference function on ITS-90
 0.394501280250E-01
 ITS-90 Table for type T thermocouple
 °C      0      1      2
   0  0.000  0.039  0.078
`

describe('the reader of the printed tables', () => {
  it('reads rows that rise and rows that fall, and no coefficients', () => {
    const { K, T, B } = parseLetterTables(TEXT)
    expect([...K].sort(([a], [b]) => a - b)).toEqual([
      [-12, -0.47],
      [-11, -0.431],
      [-10, -0.392],
      [-3, -0.118],
      [-2, -0.079],
      [-1, -0.039],
      [0, 0],
      [1, 0.039],
      [2, 0.079],
      [3, 0.119],
    ])
    expect(T.get(2)).toBe(0.078)
    expect(B.size).toBe(0)
  })

  it('refuses a table that contradicts itself', () => {
    expect(() => parseLetterTables(`${TEXT}\n   0  0.000  0.040\n`)).toThrow('0.039 and 0.04 mV at 1 °C')
  })

  it.each([
    ['B', 1820, 13.82],
    ['E', -270, -9.835],
    ['J', 1200, 69.553],
    ['K', 100, 4.096],
    ['N', 1300, 47.513],
    ['R', 1768, 21.101],
    ['S', -50, -0.236],
    ['T', 400, 20.872],
  ] as const)('type %s at %d °C is printed as %d mV', (type, celsius, millivolts) => {
    expect(LETTER_TABLES[type].get(celsius)).toBe(millivolts)
  })
})
