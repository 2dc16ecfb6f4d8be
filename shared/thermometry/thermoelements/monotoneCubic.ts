/** One interval of a piecewise cubic in Hermite form on equally spaced points. */
export interface Interpolated {
  value: number
  slope: number
}

/** Slopes at the points by the harmonic mean of the neighbouring secants; zero at a turning point. */
function pointSlopes(values: readonly number[], step: number): number[] {
  const secants = values.slice(1).map((value, i) => (value - (values[i] ?? 0)) / step)
  return values.map((_, i) => {
    const left = secants[i - 1]
    const right = secants[i]
    if (left === undefined || right === undefined) return endSlope(secants, i === 0)
    return left * right <= 0 ? 0 : (2 * left * right) / (left + right)
  })
}

/** Three-point slope at an end, held to the sign and three times the size of the end secant. */
function endSlope(secants: readonly number[], atStart: boolean): number {
  const [end, inner] = atStart ? [secants[0], secants[1]] : [secants.at(-1), secants.at(-2)]
  if (end === undefined) return 0
  const slope = inner === undefined ? end : (3 * end - inner) / 2
  if (slope * end <= 0) return 0
  return Math.abs(slope) > 3 * Math.abs(end) ? 3 * end : slope
}

/**
 * Monotone piecewise cubic interpolation through equally spaced points starting at x = 0: no overshoot between them.
 *
 * @param x within 0 … step · (values.length − 1)
 * @see F. N. Fritsch and J. Butland, A method for constructing local monotone piecewise cubic interpolants, SIAM J.
 *   Sci. Stat. Comput. 5 (1984)
 */
export function interpolateMonotone(values: readonly number[], step: number, x: number): Interpolated {
  const slopes = pointSlopes(values, step)
  const i = Math.min(Math.floor(x / step), values.length - 2)
  const t = x / step - i
  const [y0, y1] = [values[i] ?? 0, values[i + 1] ?? 0]
  const [m0, m1] = [(slopes[i] ?? 0) * step, (slopes[i + 1] ?? 0) * step]
  const value =
    y0 * (1 + 2 * t) * (1 - t) ** 2 + m0 * t * (1 - t) ** 2 + y1 * t * t * (3 - 2 * t) + m1 * t * t * (t - 1)
  const slope = (6 * t * (t - 1) * (y0 - y1) + m0 * (1 - t) * (1 - 3 * t) + m1 * t * (3 * t - 2)) / step
  return { value, slope }
}
