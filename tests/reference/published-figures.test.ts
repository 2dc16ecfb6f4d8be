import { describe, expect, it } from 'vitest'
import type { Comparison } from './comparison'
import { outcomeOf } from './comparison'
import { COMPARISONS } from './comparisons'

describe('published figures', () => {
  const named = COMPARISONS.map((comparison) => [comparison.title, comparison.source, comparison] as const)

  it.each(named)('%s (%s)', (_title, _source, comparison) => {
    const { compared, beyond } = outcomeOf(comparison)
    expect(beyond).toEqual([])
    expect(compared).toBe(comparison.count)
  })

  it('more than 12,000 table entries are among them', () => {
    const entries = COMPARISONS.filter(({ source }) => source.startsWith('printed table'))
    expect(entries.reduce((sum, { count }) => sum + count, 0)).toBe(12026)
  })
})

describe('a comparison', () => {
  const withDeviations = (...deviations: number[]): Comparison => ({
    title: 'example',
    source: 'none',
    unit: 'mV',
    allowed: { low: -1, high: 2 },
    count: deviations.length,
    points: () => deviations.map((computed, celsius) => ({ celsius, computed, published: 0 })),
  })

  it('finds what is beyond either limit, and no number at all', () => {
    const { beyond } = outcomeOf(withDeviations(-1, 2, -1.5, 2.5, Number.NaN))
    expect(beyond).toEqual(['-1.5 mV at 2 °C', '2.5 mV at 3 °C', 'NaN mV at 4 °C'])
  })

  it('names the largest deviation and its place', () => {
    expect(outcomeOf(withDeviations(0.5, -0.9, 0.1))).toMatchObject({
      compared: 3,
      largest: -0.9,
      atCelsius: 1,
    })
  })
})
