import type { LetterType } from '../../thermometry/its90'
import { LETTER_TYPES } from '../../thermometry/its90'
import type { Thermoelement } from '../../thermometry/thermoelements'
import { legsOf, pairType, sameThermoelement } from '../../thermometry/thermoelements'

/** A cable by its pair: a letter type, two coppers, or any two conductors chosen one by one. */
export type CableChoice = LetterType | 'copper' | 'other'
export const CABLE_CHOICES: readonly CableChoice[] = [...LETTER_TYPES, 'copper', 'other']

/** What a choice is called. */
export function cableWords(choice: CableChoice): string {
  if (choice === 'copper') return 'Copper pair (Cu/Cu)'
  if (choice === 'other') return 'Other conductors'
  const { positive, negative } = legsOf(choice)
  return `Type ${choice} pair (${positive}/${negative})`
}

/** Which choice two conductors are. */
export function cableOf(positive: Thermoelement, negative: Thermoelement): CableChoice {
  if (sameThermoelement(positive, 'Cu') && sameThermoelement(negative, 'Cu')) return 'copper'
  const pair = pairType(positive, negative)
  return pair && !pair.reversed ? pair.type : 'other'
}

/** The conductors of a choice; null for `other`, whose conductors stay as they are. */
export function conductorsOf(
  choice: CableChoice,
): { positive: Thermoelement; negative: Thermoelement } | null {
  if (choice === 'other') return null
  return choice === 'copper' ? { positive: 'Cu', negative: 'Cu' } : legsOf(choice)
}
