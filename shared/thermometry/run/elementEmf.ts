import type { LetterType } from '../its90'
import { emfMillivolts, letterTypeRange } from '../its90'
import type { Thermoelement } from '../thermoelements'
import { pairType, thermoelementInfo, thermoelementMillivolts } from '../thermoelements'
import type { CircuitElement, LegConductors } from './circuit'
import type { Leg, LegValues } from './types'

function holds(conductor: Thermoelement, celsius: number): boolean {
  const { lowCelsius, highCelsius } = thermoelementInfo(conductor)
  return celsius >= lowCelsius && celsius <= highCelsius
}

/**
 * emf of one leg of an element, in the sense of the walk + terminal → tip → − terminal, mV.
 * Null where the single-leg data of the conductor do not reach.
 */
export function legMillivolts(
  conductor: Thermoelement,
  leg: Leg,
  tipSideCelsius: number,
  displaySideCelsius: number,
): number | null {
  // The law of intermediate metals: between equal temperatures any conductor adds nothing, data or no data.
  if (tipSideCelsius === displaySideCelsius) return 0
  if (!holds(conductor, tipSideCelsius) || !holds(conductor, displaySideCelsius)) return null
  const rise =
    thermoelementMillivolts(conductor, tipSideCelsius) -
    thermoelementMillivolts(conductor, displaySideCelsius)
  return leg === 'positive' ? rise : -rise
}

function holdsLetter(type: LetterType, celsius: number): boolean {
  const { lowCelsius, highCelsius } = letterTypeRange(type)
  return celsius >= lowCelsius && celsius <= highCelsius
}

/**
 * emf of a pair of conductors between the given end temperatures, mV. A matched pair between equal temperatures
 * uses its letter function over that function's whole range; everything else adds single legs.
 * Null where the data do not reach.
 */
export function pairMillivolts(
  conductors: LegConductors,
  tipSide: LegValues,
  displaySide: LegValues,
): number | null {
  const matched = pairType(conductors.positive, conductors.negative)
  const sameEnds = tipSide.positive === tipSide.negative && displaySide.positive === displaySide.negative
  if (matched && sameEnds && tipSide.positive !== displaySide.positive) {
    const { type, reversed } = matched
    if (!holdsLetter(type, tipSide.positive) || !holdsLetter(type, displaySide.positive)) return null
    const rise = emfMillivolts(type, tipSide.positive) - emfMillivolts(type, displaySide.positive)
    return reversed ? -rise : rise
  }
  const positive = legMillivolts(conductors.positive, 'positive', tipSide.positive, displaySide.positive)
  const negative = legMillivolts(conductors.negative, 'negative', tipSide.negative, displaySide.negative)
  return positive === null || negative === null ? null : positive + negative
}

/** emf of an element as it is, mV; null where the data do not reach. */
export function elementMillivolts(element: CircuitElement): number | null {
  return pairMillivolts(element.conductors, element.tipSideCelsius, element.displaySideCelsius)
}

/** Sum over elements, mV; null when any of them is null. */
export function totalMillivolts(elements: readonly CircuitElement[]): number | null {
  let sum = 0
  for (const element of elements) {
    const millivolts = elementMillivolts(element)
    if (millivolts === null) return null
    sum += millivolts
  }
  return sum
}
