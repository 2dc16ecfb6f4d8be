import { requireWithin } from '../errors'
import { pieceAt, pieceMillivolts, pieceMillivoltsPerKelvin } from '../its90/piece'
import type { PlatinumLeg } from './singleLegs'
import { SINGLE_LEG_FUNCTIONS } from './singleLegs'

/** Range of a leg's single-leg function, °C. */
export function platinumLegRange(leg: PlatinumLeg): { lowCelsius: number; highCelsius: number } {
  const { pieces } = SINGLE_LEG_FUNCTIONS[leg]
  return { lowCelsius: pieces[0].lowCelsius, highCelsius: (pieces.at(-1) ?? pieces[0]).highCelsius }
}

/**
 * emf of a single thermoelement against platinum Pt-67, reference junction at 0 °C.
 *
 * @param celsius °C, within `platinumLegRange(leg)`
 * @returns mV, negative for negative legs
 * @throws OutOfRangeError, NotANumberError
 * @see NIST Monograph 175, single-leg tables
 */
export function emfAgainstPlatinum67(leg: PlatinumLeg, celsius: number): number {
  const { lowCelsius, highCelsius } = platinumLegRange(leg)
  requireWithin(`${leg} temperature`, celsius, lowCelsius, highCelsius, '°C')
  return pieceMillivolts(pieceAt(SINGLE_LEG_FUNCTIONS[leg].pieces, celsius), celsius)
}

/** Derivative of `emfAgainstPlatinum67`, mV/K; same range and errors. */
export function sensitivityAgainstPlatinum67(leg: PlatinumLeg, celsius: number): number {
  const { lowCelsius, highCelsius } = platinumLegRange(leg)
  requireWithin(`${leg} temperature`, celsius, lowCelsius, highCelsius, '°C')
  return pieceMillivoltsPerKelvin(pieceAt(SINGLE_LEG_FUNCTIONS[leg].pieces, celsius), celsius)
}
