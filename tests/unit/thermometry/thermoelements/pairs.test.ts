import { describe, expect, it } from 'vitest'
import { LETTER_TYPES } from '#shared/thermometry/its90'
import {
  THERMOELEMENTS,
  canonicalThermoelement,
  legsOf,
  pairType,
  sameThermoelement,
} from '#shared/thermometry/thermoelements'

describe('canonicalThermoelement', () => {
  it.each([
    ['EP', 'KP'],
    ['EN', 'TN'],
    ['Cu', 'TP'],
    ['SN', 'RN'],
    ['JN', 'JN'],
    ['brass', 'brass'],
  ] as const)('%s is kept as %s', (element, name) => {
    expect(canonicalThermoelement(element)).toBe(name)
  })

  it('is its own canonical name', () => {
    for (const element of THERMOELEMENTS) {
      const name = canonicalThermoelement(element)
      expect(canonicalThermoelement(name)).toBe(name)
    }
  })
})

describe('sameThermoelement', () => {
  it('sees through the names', () => {
    expect(sameThermoelement('EP', 'KP')).toBe(true)
    expect(sameThermoelement('TN', 'EN')).toBe(true)
    expect(sameThermoelement('Cu', 'TP')).toBe(true)
  })

  it('keeps apart what only looks alike', () => {
    expect(sameThermoelement('JN', 'EN')).toBe(false)
    expect(sameThermoelement('iron', 'JP')).toBe(false)
    expect(sameThermoelement('RP', 'SP')).toBe(false)
  })
})

describe('pairType', () => {
  it.each(LETTER_TYPES)('recognises the legs of type %s, either way round', (type) => {
    const { positive, negative } = legsOf(type)
    expect(pairType(positive, negative)).toEqual({ type, reversed: false })
    expect(pairType(negative, positive)).toEqual({ type, reversed: true })
  })

  it.each([
    ['KP', 'TN', 'E'],
    ['EP', 'KN', 'K'],
    ['Cu', 'EN', 'T'],
    ['SP', 'RN', 'S'],
  ] as const)('%s with %s is type %s', (positive, negative, type) => {
    expect(pairType(positive, negative)).toEqual({ type, reversed: false })
  })

  it.each([
    ['KP', 'KP'],
    ['KP', 'Cu'],
    ['JP', 'EN'],
    ['Cu', 'JN'],
    ['Cu', 'Cu'],
    ['iron', 'JN'],
    ['RP', 'SP'],
  ] as const)('%s with %s is none', (positive, negative) => {
    expect(pairType(positive, negative)).toBeNull()
  })
})
