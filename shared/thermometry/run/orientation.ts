import { pairType, sameThermoelement } from '../thermoelements'
import type { LegConductors } from './circuit'

/**
 * Whether a pair lies in the wrong legs. The alloys decide where they can: by the planned conductors first, then
 * as a pair of some other letter type. Where they cannot (two coppers, say), the crossings between the section
 * and the display decide.
 *
 * @param crossedToDisplay whether an odd number of crossings lies between the section and the display
 */
export function isReversed(
  conductors: LegConductors,
  intended: LegConductors,
  crossedToDisplay: boolean,
): boolean {
  const { positive, negative } = conductors
  const straight =
    sameThermoelement(positive, intended.positive) || sameThermoelement(negative, intended.negative)
  const swapped =
    sameThermoelement(positive, intended.negative) || sameThermoelement(negative, intended.positive)
  if (straight !== swapped) return swapped
  const pair = pairType(positive, negative)
  return pair ? pair.reversed : crossedToDisplay
}
