import type { LetterType } from '../its90'
import { LETTER_TYPES } from '../its90'
import type { Thermoelement } from './ids'

/** One name for conductors that the standards define as one alloy (ASTM E230: EP ≡ KP, EN ≡ TN; copper ≡ TP). */
const ALIASES: Partial<Record<Thermoelement, Thermoelement>> = { EP: 'KP', EN: 'TN', Cu: 'TP', SN: 'RN' }

/** The one name under which a conductor's data are kept. */
export function canonicalThermoelement(element: Thermoelement): Thermoelement {
  return ALIASES[element] ?? element
}

/** True where two names stand for one alloy. */
export function sameThermoelement(a: Thermoelement, b: Thermoelement): boolean {
  return canonicalThermoelement(a) === canonicalThermoelement(b)
}

/** The conductors of a letter type. */
export function legsOf(type: LetterType): { positive: Thermoelement; negative: Thermoelement } {
  return { positive: `${type}P`, negative: `${type}N` }
}

/**
 * The letter type two conductors make, and whether they stand in each other's place. R before S where only
 * platinum would tell; null for any other pair.
 */
export function pairType(
  positive: Thermoelement,
  negative: Thermoelement,
): { type: LetterType; reversed: boolean } | null {
  for (const type of LETTER_TYPES) {
    const legs = legsOf(type)
    if (sameThermoelement(positive, legs.positive) && sameThermoelement(negative, legs.negative))
      return { type, reversed: false }
    if (sameThermoelement(positive, legs.negative) && sameThermoelement(negative, legs.positive))
      return { type, reversed: true }
  }
  return null
}
