/** A straight mapping of values to places on paper. */
export interface Scale {
  place: (value: number) => number
  /** The value that lies at a place. */
  valueAt: (place: number) => number
}

/** Maps [low, high] to [from, to]; `from` may lie beyond `to`. */
export function linearScale(
  [low, high]: readonly [number, number],
  [from, to]: readonly [number, number],
): Scale {
  const perUnit = (to - from) / (high - low)
  return {
    place: (value) => from + (value - low) * perUnit,
    valueAt: (place) => low + (place - from) / perUnit,
  }
}

/** Step of 1, 2 or 5 times a power of ten that divides a span into at most `most` parts. */
export function niceStep(span: number, most: number): number {
  const rough = span / most
  const power = 10 ** Math.floor(Math.log10(rough))
  const step = [1, 2, 5, 10].find((factor) => factor * power >= rough * (1 - 1e-9)) ?? 10
  return step * power
}

/** Decimals that a step needs to be written in full. */
export function stepDecimals(step: number): number {
  return Math.max(0, -Math.floor(Math.log10(step) + 1e-9))
}

/** Multiples of a nice step within [low, high], ascending. Empty where the span is none. */
export function niceTicks(low: number, high: number, most: number): { values: number[]; decimals: number } {
  if (!(high > low)) return { values: [], decimals: 0 }
  const step = niceStep(high - low, most)
  const first = Math.ceil(low / step - 1e-9)
  const last = Math.floor(high / step + 1e-9)
  const values = Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step)
  return { values, decimals: stepDecimals(step) }
}

/** A range widened about its middle where it is narrower than `least`. */
export function atLeast([low, high]: readonly [number, number], least: number): [number, number] {
  const lacking = Math.max(0, least - (high - low)) / 2
  return [low - lacking, high + lacking]
}
