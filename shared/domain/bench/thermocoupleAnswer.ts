import type { LetterType } from '../../thermometry/its90'
import {
  celsiusFromMillivolts,
  emfMillivolts,
  letterTypeRange,
  sensitivityMillivoltsPerKelvin,
} from '../../thermometry/its90'
import type { ThermocoupleAnswer } from '../../types/bench'

export interface ThermocoupleQuestion {
  type: LetterType
  /** Temperature of the reference junction, °C; 0 unless given. */
  coldJunctionCelsius?: number
  /** Tip temperature, °C, to be turned into an emf … */
  celsius?: number
  /** … or emf at the terminals, mV, to be turned into a tip temperature. */
  millivolts?: number
}

const SOURCE = 'ITS-90 reference functions, NIST Monograph 175 (NIST Standard Reference Database 60)'

/**
 * The thermocouple calculator: temperature to emf at the terminals, or back, for a chosen cold junction.
 * V = E(T) − E(T_cold), so T = E⁻¹(V + E(T_cold)).
 *
 * @param question exactly one of `celsius` and `millivolts` given
 * @throws OutOfRangeError when a temperature or emf lies outside the range of the type
 * @see NIST Monograph 175
 */
export function thermocoupleAnswer(question: ThermocoupleQuestion): ThermocoupleAnswer {
  const { type, coldJunctionCelsius = 0 } = question
  const coldMillivolts = emfMillivolts(type, coldJunctionCelsius)
  const celsius = question.celsius ?? celsiusFromMillivolts(type, (question.millivolts ?? 0) + coldMillivolts)
  return {
    type,
    celsius,
    coldJunctionCelsius,
    millivolts: question.millivolts ?? emfMillivolts(type, celsius) - coldMillivolts,
    sensitivityMillivoltsPerKelvin: sensitivityMillivoltsPerKelvin(type, celsius),
    range: letterTypeRange(type),
    source: SOURCE,
  }
}
