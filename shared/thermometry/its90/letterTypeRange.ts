import { REFERENCE_FUNCTIONS } from './coefficients'
import type { LetterType } from './letterType'

/** Range of a type's reference function, °C (NIST Monograph 175). */
export function letterTypeRange(type: LetterType): { lowCelsius: number; highCelsius: number } {
  const { direct } = REFERENCE_FUNCTIONS[type]
  return { lowCelsius: direct[0].lowCelsius, highCelsius: (direct.at(-1) ?? direct[0]).highCelsius }
}
