import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { atLeast, linearScale, niceStep, niceTicks } from '~/drawing/plot/scale'

describe('niceStep', () => {
  it.each([
    [10, 5, 2],
    [10, 10, 1],
    [0.7, 7, 0.1],
    [171, 9, 20],
    [23, 5, 5],
    [9.5, 10, 1],
  ])('divides %d into at most %d parts by %d', (span, most, step) => {
    expect(niceStep(span, most)).toBeCloseTo(step, 12)
  })
})

describe('niceTicks', () => {
  it('are multiples of the step with the decimals it needs', () => {
    expect(niceTicks(-0.3, 2.1, 5)).toEqual({ values: [0, 0.5, 1, 1.5, 2], decimals: 1 })
    expect(niceTicks(18, 212, 5).decimals).toBe(0)
  })

  it('are none on an empty span', () => {
    expect(niceTicks(5, 5, 4).values).toEqual([])
    expect(niceTicks(5, 4, 4).values).toEqual([])
  })

  it('lie within the span, ascending, and are no more than asked for', () => {
    const span = fc.tuple(
      fc.double({ min: -1e4, max: 1e4, noNaN: true }),
      fc.double({ min: 1e-3, max: 1e4, noNaN: true }),
    )
    fc.assert(
      fc.property(span, fc.integer({ min: 2, max: 12 }), ([low, size], most) => {
        const { values } = niceTicks(low, low + size, most)
        const slack = size * 1e-6
        return (
          values.length <= most + 1 &&
          values.every((value, index) => index === 0 || value > (values[index - 1] ?? value)) &&
          values.every((value) => value >= low - slack && value <= low + size + slack)
        )
      }),
    )
  })
})

describe('linearScale', () => {
  it('maps both ends, and back again, upside down too', () => {
    const scale = linearScale([0, 8], [300, 20])
    expect(scale.place(0)).toBe(300)
    expect(scale.place(8)).toBe(20)
    expect(scale.valueAt(scale.place(3.3))).toBeCloseTo(3.3, 12)
  })
})

describe('atLeast', () => {
  it('widens a narrow range about its middle and leaves a wide one', () => {
    expect(atLeast([20, 20], 10)).toEqual([15, 25])
    expect(atLeast([0, 30], 10)).toEqual([0, 30])
  })
})
