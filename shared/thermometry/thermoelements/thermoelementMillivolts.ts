import { requireWithin } from '../errors'
import { emfMillivolts, sensitivityMillivoltsPerKelvin } from '../its90'
import { emfAgainstPlatinum67, sensitivityAgainstPlatinum67 } from './emfAgainstPlatinum67'
import type { Thermoelement } from './ids'
import { isOtherMetal, thermoelementInfo } from './info'
import { interpolateMonotone } from './monotoneCubic'
import { OTHER_METALS_AGAINST_PLATINUM, OTHER_METALS_STEP_KELVIN } from './otherMetals'
import { canonicalThermoelement } from './pairs'
import type { PlatinumLeg } from './singleLegs'

/** A letter function and a single-leg function, and which of the two quantities is wanted of them. */
interface Quantity {
  letter: typeof emfMillivolts
  leg: (leg: PlatinumLeg, celsius: number) => number
  metal: 'value' | 'slope'
}

const MILLIVOLTS: Quantity = { letter: emfMillivolts, leg: emfAgainstPlatinum67, metal: 'value' }
const SENSITIVITY: Quantity = {
  letter: sensitivityMillivoltsPerKelvin,
  leg: sensitivityAgainstPlatinum67,
  metal: 'slope',
}

/** Against TN. Conductors of E, K and T by their letter functions, all others by way of platinum. */
function againstConstantan(element: Thermoelement, celsius: number, of: Quantity): number {
  const name = canonicalThermoelement(element)
  if (isOtherMetal(name)) {
    const table = OTHER_METALS_AGAINST_PLATINUM[name]
    return interpolateMonotone(table, OTHER_METALS_STEP_KELVIN, celsius)[of.metal] - of.leg('EN', celsius)
  }
  switch (name) {
    case 'TN':
      return 0
    case 'KP':
      return of.letter('E', celsius)
    case 'TP':
      return of.letter('T', celsius)
    case 'KN':
      return of.letter('E', celsius) - of.letter('K', celsius)
    case 'RN':
      return -of.leg('EN', celsius)
    case 'RP':
      return of.letter('R', celsius) - of.leg('EN', celsius)
    case 'SP':
      return of.letter('S', celsius) - of.leg('EN', celsius)
    case 'EP':
    case 'EN':
    case 'SN':
    case 'Cu':
      return againstConstantan(canonicalThermoelement(name), celsius, of)
    default:
      return of.leg(name, celsius) - of.leg('EN', celsius)
  }
}

function requireData(element: Thermoelement, celsius: number): void {
  const { symbol, lowCelsius, highCelsius } = thermoelementInfo(element)
  requireWithin(`${symbol} temperature`, celsius, lowCelsius, highCelsius, '°C')
}

/**
 * emf of a single conductor against the common reference, the copper-nickel negative conductor of types E and T
 * (TN), with 0 mV at 0 °C. The emf of any pair is the difference of two of these.
 *
 * @param celsius °C, within the range `thermoelementInfo(element)` states
 * @returns mV
 * @throws OutOfRangeError beyond that range; NotANumberError for NaN or infinity
 * @see NIST Monograph 175: letter functions for KP, KN, TP, single-leg tables for the other letters; other metals
 *   from a handbook table, unverified
 */
export function thermoelementMillivolts(element: Thermoelement, celsius: number): number {
  requireData(element, celsius)
  return againstConstantan(element, celsius, MILLIVOLTS)
}

/** Derivative of `thermoelementMillivolts`, mV/K; same range and errors. */
export function thermoelementSensitivityMillivoltsPerKelvin(element: Thermoelement, celsius: number): number {
  requireData(element, celsius)
  return againstConstantan(element, celsius, SENSITIVITY)
}
