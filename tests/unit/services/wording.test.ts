import { describe, expect, it } from 'vitest'
import { nameSome } from '~~/server/services/wording'

describe('names in a message', () => {
  it.each([
    [[], ''],
    [['EGT 1'], 'EGT 1'],
    [['EGT 1', 'EGT 2'], 'EGT 1 and EGT 2'],
    [['EGT 1', 'EGT 2', 'EGT 3'], 'EGT 1, EGT 2 and EGT 3'],
    [['a', 'b', 'c', 'd'], 'a, b, c and 1 more'],
    [['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'], 'a, b, c and 5 more'],
  ])('%j', (names, text) => {
    expect(nameSome(names)).toBe(text)
  })
})
