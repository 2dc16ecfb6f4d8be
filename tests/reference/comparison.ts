/** One computed figure beside the published one. */
export interface Point {
  celsius: number
  computed: number
  published: number
}

/** A set of published figures, and how far the computed ones may be from them. */
export interface Comparison {
  title: string
  /** Where the figures were published, and whether they could be read there. */
  source: string
  unit: 'mV' | 'K' | 'µV/K'
  /** Limits of computed − published. */
  allowed: { low: number; high: number }
  /** How many figures are compared: a reader of tables that finds nothing must not pass. */
  count: number
  points: () => readonly Point[]
}

export interface Outcome {
  compared: number
  /** computed − published, of the figure that is farthest from what was published. */
  largest: number
  /** Where it is so, °C. */
  atCelsius: number
  /** Figures beyond what is allowed, in words. */
  beyond: string[]
}

/** Limits of the same size on both sides. */
export function plusMinus(limit: number): { low: number; high: number } {
  return { low: -limit, high: limit }
}

/** Limits of figures printed to a step: half of it, and what a sum of floating-point numbers may lose. */
export function halfOf(printedStep: number): { low: number; high: number } {
  return plusMinus(printedStep / 2 + 1e-6)
}

/** Whole degrees from low to high. */
export function everyDegree(low: number, high: number): number[] {
  return Array.from({ length: high - low + 1 }, (_, i) => low + i)
}

/** Evaluates a comparison. A deviation that is no number counts as beyond every limit. */
export function outcomeOf({ allowed, unit, points }: Comparison): Outcome {
  const deviations = points().map(({ celsius, computed, published }) => ({
    celsius,
    deviation: computed - published,
  }))
  const farthest = deviations.reduce(
    (worst, next) => (Math.abs(next.deviation) > Math.abs(worst.deviation) ? next : worst),
    { celsius: Number.NaN, deviation: 0 },
  )
  return {
    compared: deviations.length,
    largest: farthest.deviation,
    atCelsius: farthest.celsius,
    beyond: deviations
      .filter(({ deviation }) => !(deviation >= allowed.low && deviation <= allowed.high))
      .map(({ celsius, deviation }) => `${deviation} ${unit} at ${celsius} °C`),
  }
}
