import type { LetterType } from '../its90'
import type { Thermoelement } from '../thermoelements'
import type { ContactShare, Leg, LegValues, Place } from './types'

export type LegConductors = Record<Leg, Thermoelement>

/**
 * One stretch of the circuit with crossings resolved: each conductor stands in the leg of the display terminal
 * it leads to.
 */
export interface CircuitElement {
  place: Place
  kind: 'section' | 'joint' | 'internal'
  /** The contact at the element's display end. A joint without length is known by the section before it. */
  displayEnd: Pick<ContactShare, 'place' | 'side'>
  conductors: LegConductors
  intended: LegConductors
  /** True where the conductors lie in the legs opposite to those the planned type wants. */
  reversed: boolean
  tipSideCelsius: LegValues
  displaySideCelsius: LegValues
}

/** A run under given conditions, ready to be added up. Elements go from tip to display. */
export interface Circuit {
  type: LetterType
  tipCelsius: number
  /** True temperature of the reference point. */
  referenceCelsius: number
  /** False when the display relies on a reference block that the run does not have. */
  referenceFound: boolean
  elements: CircuitElement[]
}

/** The element with its conductors exchanged between the legs. */
export function exchangeLegs(conductors: LegConductors): LegConductors {
  return { positive: conductors.negative, negative: conductors.positive }
}

export function isIsothermal(element: CircuitElement, leg: Leg): boolean {
  return element.tipSideCelsius[leg] === element.displaySideCelsius[leg]
}
