import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { interpolateMonotone } from '#shared/thermometry/thermoelements/monotoneCubic'
import { OTHER_METALS_AGAINST_PLATINUM } from '#shared/thermometry/thermoelements/otherMetals'

const STEP = 100

function value(values: readonly number[], x: number): number {
  return interpolateMonotone(values, STEP, x).value
}

describe('interpolateMonotone', () => {
  it.each(Object.entries(OTHER_METALS_AGAINST_PLATINUM))('goes through every point of %s', (_, values) => {
    values.forEach((point, i) => expect(value(values, i * STEP)).toBeCloseTo(point, 12))
  })

  it('is a straight line through points on one, and through two points', () => {
    for (const x of [0, 37, 150, 299]) {
      expect(value([0, 1, 2, 3], x)).toBeCloseTo(x / STEP, 12)
      expect(interpolateMonotone([0, 1, 2, 3], STEP, x).slope).toBeCloseTo(1 / STEP, 12)
    }
    expect(value([0, 0.46], 25)).toBeCloseTo(0.115, 12)
  })

  it('turns nowhere but at a point that is a turning point', () => {
    for (const x of [100, 140, 199]) expect(value([0, 1, 0.2], x)).toBeLessThanOrEqual(1)
    expect(interpolateMonotone([0, 1, 0.2], STEP, 100).slope).toBe(0)
  })

  it('mirrors when its points are mirrored', () => {
    const points = [0, 0.42, 1.06, 1.88, 2.84]
    for (const x of [12, 180, 333])
      expect(
        value(
          points.map((point) => -point),
          x,
        ),
      ).toBeCloseTo(-value(points, x), 12)
  })

  it('never leaves the two points it lies between', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -10, max: 10, noNaN: true }), { minLength: 2, maxLength: 6 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (values, share) => {
          const x = share * STEP * (values.length - 1)
          const i = Math.min(Math.floor(x / STEP), values.length - 2)
          const [left, right] = [values[i] ?? Number.NaN, values[i + 1] ?? Number.NaN]
          const between = value(values, x)
          expect(between).toBeGreaterThanOrEqual(Math.min(left, right) - 1e-9)
          expect(between).toBeLessThanOrEqual(Math.max(left, right) + 1e-9)
        },
      ),
      { numRuns: 1000 },
    )
  })
})
