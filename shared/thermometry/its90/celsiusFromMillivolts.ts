import { NotANumberError, OutOfRangeError } from '../errors'
import { REFERENCE_FUNCTIONS } from './coefficients'
import { emfMillivolts } from './emfMillivolts'
import type { LetterType } from './letterType'
import { letterTypeRange } from './letterTypeRange'
import { polynomial } from './polynomial'
import { sensitivityMillivoltsPerKelvin } from './sensitivityMillivoltsPerKelvin'

/** Type B has its least emf near 21 °C and no emf again near 42 °C; above that the emf is positive and rises. */
const TYPE_B_RISING_FROM_CELSIUS = 42

/**
 * What a sum of floating-point numbers may lose, mV. Without it the emf of a temperature within a hair of an end of
 * the range would be refused, the sum at the end itself having come out smaller.
 */
const ROUNDING_MILLIVOLTS = 1e-11

export interface InverseRange {
  lowCelsius: number
  highCelsius: number
  /** Not itself within the range for type B, whose inverse is defined for positive emf alone. */
  lowMillivolts: number
  highMillivolts: number
}

/** Temperatures and emf over which a type's emf can be turned back into a temperature. */
export function inverseRange(type: LetterType): InverseRange {
  const range = letterTypeRange(type)
  const lowCelsius = type === 'B' ? TYPE_B_RISING_FROM_CELSIUS : range.lowCelsius
  return {
    lowCelsius,
    highCelsius: range.highCelsius,
    lowMillivolts: type === 'B' ? 0 : emfMillivolts(type, lowCelsius),
    highMillivolts: emfMillivolts(type, range.highCelsius),
  }
}

function firstGuess(type: LetterType, millivolts: number, low: number, high: number): number {
  const piece = REFERENCE_FUNCTIONS[type].inverse.find(
    ({ lowMillivolts, highMillivolts }) => millivolts >= lowMillivolts && millivolts <= highMillivolts,
  )
  const guess = piece ? polynomial(piece.coefficients, millivolts) : (low + high) / 2
  return Math.min(Math.max(guess, low), high)
}

/** Newton's method held inside a shrinking bracket: where a step would leave it, the bracket is halved. */
function refine(type: LetterType, millivolts: number, range: InverseRange): number {
  let low = range.lowCelsius
  let high = range.highCelsius
  let celsius = firstGuess(type, millivolts, low, high)
  for (let step = 0; step < 100; step++) {
    const excess = emfMillivolts(type, celsius) - millivolts
    if (excess === 0) return celsius
    if (excess > 0) high = celsius
    else low = celsius
    const newton = celsius - excess / sensitivityMillivoltsPerKelvin(type, celsius)
    const next = newton > low && newton < high ? newton : (low + high) / 2
    if (Math.abs(next - celsius) < 1e-10) return next
    celsius = next
  }
  return celsius
}

/**
 * Temperature from emf, reference junction at 0 °C: the published inverse as a first guess, then Newton's method
 * on the reference function until both agree; where the published inverse does not reach, a bracketed start.
 * Round trip ≤ 1e-6 °C; for type B claimed from 50 °C.
 *
 * @param millivolts emf, mV, within `inverseRange(type)`
 * @returns °C (ITS-90)
 * @throws OutOfRangeError beyond the range; NotANumberError for NaN or infinity
 * @see NIST Monograph 175
 */
export function celsiusFromMillivolts(type: LetterType, millivolts: number): number {
  if (!Number.isFinite(millivolts)) throw new NotANumberError(`type ${type} emf`)
  const range = inverseRange(type)
  const { lowMillivolts, highMillivolts } = range
  const tooLow = type === 'B' ? millivolts <= 0 : millivolts < lowMillivolts - ROUNDING_MILLIVOLTS
  if (tooLow || millivolts > highMillivolts + ROUNDING_MILLIVOLTS) {
    const reason =
      type === 'B' && tooLow
        ? 'Below about 42 °C type B has two temperatures for one emf, so only a positive emf tells.'
        : ''
    throw new OutOfRangeError(`type ${type} emf`, millivolts, lowMillivolts, highMillivolts, 'mV', reason)
  }
  return refine(type, millivolts, range)
}
