import { requireWithin } from '../errors'
import { REFERENCE_FUNCTIONS } from './coefficients'
import type { LetterType } from './letterType'
import { letterTypeRange } from './letterTypeRange'
import { pieceAt, pieceMillivolts } from './piece'

/**
 * emf of a thermocouple with its reference junction at 0 °C.
 *
 * @param celsius temperature of the measuring junction, °C (ITS-90), within `letterTypeRange(type)`
 * @returns emf, mV
 * @throws OutOfRangeError beyond the range of the type; NotANumberError for NaN or infinity
 * @see NIST Monograph 175
 */
export function emfMillivolts(type: LetterType, celsius: number): number {
  const { lowCelsius, highCelsius } = letterTypeRange(type)
  requireWithin(`type ${type} temperature`, celsius, lowCelsius, highCelsius, '°C')
  return pieceMillivolts(pieceAt(REFERENCE_FUNCTIONS[type].direct, celsius), celsius)
}
