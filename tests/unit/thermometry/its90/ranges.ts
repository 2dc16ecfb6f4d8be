import type { LetterType } from '#shared/thermometry/its90'
import { letterTypeRange } from '#shared/thermometry/its90'
import { REFERENCE_FUNCTIONS } from '#shared/thermometry/its90/coefficients'

/** Above this the emf of type B is well away from its turning point; the round trip is claimed from here. */
const TYPE_B_FROM_CELSIUS = 50

/** The part of a type's range in which its emf rises, °C. */
export function risingRange(type: LetterType): { low: number; high: number } {
  const { lowCelsius, highCelsius } = letterTypeRange(type)
  return { low: type === 'B' ? TYPE_B_FROM_CELSIUS : lowCelsius, high: highCelsius }
}

/** True within `step` of a join of two pieces, where the published slope may jump: type N's by 0.2 µV/K at 0 °C. */
export function isAtJoin(type: LetterType, celsius: number, step: number): boolean {
  const joins = REFERENCE_FUNCTIONS[type].direct.slice(1).map(({ lowCelsius }) => lowCelsius)
  return joins.some((join) => Math.abs(celsius - join) <= step)
}
