import { requireWithin } from '../errors'
import { REFERENCE_FUNCTIONS } from './coefficients'
import type { LetterType } from './letterType'
import { letterTypeRange } from './letterTypeRange'
import { pieceAt, pieceMillivoltsPerKelvin } from './piece'

/**
 * Sensitivity dE/dT (Seebeck coefficient of the pair), from the derivative of the reference function.
 *
 * @param celsius °C (ITS-90), within `letterTypeRange(type)`
 * @returns mV/K
 * @throws OutOfRangeError beyond the range of the type; NotANumberError for NaN or infinity
 * @see NIST Monograph 175
 */
export function sensitivityMillivoltsPerKelvin(type: LetterType, celsius: number): number {
  const { lowCelsius, highCelsius } = letterTypeRange(type)
  requireWithin(`type ${type} temperature`, celsius, lowCelsius, highCelsius, '°C')
  return pieceMillivoltsPerKelvin(pieceAt(REFERENCE_FUNCTIONS[type].direct, celsius), celsius)
}
