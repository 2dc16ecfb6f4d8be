import { describe, expect, it } from 'vitest'
import { groupBy } from '~~/server/db/groupBy'

describe('groups', () => {
  it('keep the order of their items, and come in the order of their first ones', () => {
    const groups = groupBy([3, 10, 4, 12, 5], (number) => number >= 10)
    expect([...groups]).toEqual([
      [false, [3, 4, 5]],
      [true, [10, 12]],
    ])
  })

  it('are none of nothing', () => {
    expect(groupBy([], () => 'any').size).toBe(0)
  })
})
