import { describe, expect, it } from 'vitest'
import { refuseTable, referenceTable } from '#shared/domain/bench/referenceTable'
import { thermocoupleAnswer } from '#shared/domain/bench/thermocoupleAnswer'
import { OutOfRangeError } from '#shared/thermometry'

describe('thermocoupleAnswer', () => {
  /** NIST Monograph 175, table of type K: E(300) = 12.209, E(25) = 1.000, E(20) = 0.798 mV. */
  it('gives the printed emf, and the temperature back', () => {
    expect(thermocoupleAnswer({ type: 'K', celsius: 300 }).millivolts).toBeCloseTo(12.209, 3)
    expect(thermocoupleAnswer({ type: 'K', celsius: 300, coldJunctionCelsius: 25 }).millivolts).toBeCloseTo(
      11.209,
      2,
    )
    expect(thermocoupleAnswer({ type: 'K', millivolts: 12.209 }).celsius).toBeCloseTo(300, 1)
    expect(
      thermocoupleAnswer({ type: 'K', millivolts: -0.798, coldJunctionCelsius: 20 }).celsius,
    ).toBeCloseTo(0, 1)
  })

  it('keeps an emf of zero apart from none', () => {
    expect(thermocoupleAnswer({ type: 'K', millivolts: 0, coldJunctionCelsius: 30 }).celsius).toBeCloseTo(
      30,
      6,
    )
  })

  it('names the range it cannot leave', () => {
    expect(() => thermocoupleAnswer({ type: 'T', celsius: 401 })).toThrow(OutOfRangeError)
    expect(() => thermocoupleAnswer({ type: 'T', celsius: 401 })).toThrow(/-270 to 400/)
  })
})

describe('referenceTable', () => {
  const celsius = { type: 'K', unit: 'celsius', from: 0, to: 25, step: 1, coldJunction: 0 } as const

  /** NIST Monograph 175, table of type K, rows 0, 10 and 20 °C. */
  it('prints the published rows', () => {
    const rows = referenceTable(celsius)
    expect(rows.map(({ start }) => start)).toEqual([0, 10, 20])
    const printed = rows[1]?.millivolts.map((value) => value?.toFixed(3))
    expect(printed).toEqual([
      '0.397',
      '0.437',
      '0.477',
      '0.517',
      '0.557',
      '0.597',
      '0.637',
      '0.677',
      '0.718',
      '0.758',
    ])
    expect(rows[2]?.millivolts.filter((value) => value !== null)).toHaveLength(6)
  })

  it('counts in °F where asked', () => {
    const [row] = referenceTable({ ...celsius, unit: 'fahrenheit', from: 32, to: 39, coldJunction: 32 })
    expect(row?.start).toBe(30)
    expect(row?.millivolts.slice(0, 3)).toEqual([null, null, 0])
  })

  it('refuses what is no table or a book', () => {
    expect(refuseTable(celsius)).toBeNull()
    expect(refuseTable({ ...celsius, step: 0 })?.field).toBe('step')
    expect(refuseTable({ ...celsius, to: 0 })?.field).toBe('to')
    expect(refuseTable({ ...celsius, to: 1300, step: 0.1 })?.reason).toMatch(/3000/)
    expect(refuseTable({ ...celsius, from: Number.NaN })).not.toBeNull()
  })
})
