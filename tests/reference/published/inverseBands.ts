import type { LetterType } from '#shared/thermometry/its90'

/** Range and error of one published inverse function, °C: inverse minus true temperature. */
interface InverseBand {
  type: LetterType
  /** Its place among the inverse functions of the type. */
  index: number
  lowCelsius: number
  highCelsius: number
  errorLow: number
  errorHigh: number
  /** Step to which the error is printed. */
  printed: number
}

type Row = readonly [
  lowCelsius: number,
  highCelsius: number,
  errorLow: number,
  errorHigh: number,
  printed: number,
]

const ROWS: Record<LetterType, readonly Row[]> = {
  B: [
    [250, 700, -0.02, 0.03, 0.01],
    [700, 1820, -0.01, 0.02, 0.01],
  ],
  E: [
    [-200, 0, -0.01, 0.03, 0.01],
    [0, 1000, -0.02, 0.02, 0.01],
  ],
  J: [
    [-210, 0, -0.05, 0.03, 0.01],
    [0, 760, -0.04, 0.04, 0.01],
    [760, 1200, -0.04, 0.03, 0.01],
  ],
  K: [
    [-200, 0, -0.02, 0.04, 0.01],
    [0, 500, -0.05, 0.04, 0.01],
    [500, 1372, -0.05, 0.06, 0.01],
  ],
  N: [
    [-200, 0, -0.02, 0.03, 0.01],
    [0, 600, -0.02, 0.03, 0.01],
    [600, 1300, -0.04, 0.02, 0.01],
  ],
  R: [
    [-50, 250, -0.02, 0.02, 0.01],
    [250, 1200, -0.005, 0.005, 0.001],
    [1064, 1664.5, -0.0005, 0.001, 0.0001],
    [1664.5, 1768.1, -0.001, 0.002, 0.001],
  ],
  S: [
    [-50, 250, -0.02, 0.02, 0.01],
    [250, 1200, -0.01, 0.01, 0.01],
    [1064, 1664.5, -0.0002, 0.0002, 0.0001],
    [1664.5, 1768.1, -0.002, 0.002, 0.001],
  ],
  T: [
    [-200, 0, -0.02, 0.04, 0.01],
    [0, 400, -0.03, 0.03, 0.01],
  ],
}

/** Bands as printed above the inverse coefficients. Source: NIST Standard Reference Database 60. */
export const INVERSE_BANDS: readonly InverseBand[] = Object.entries(ROWS).flatMap(([type, rows]) =>
  rows.map(([lowCelsius, highCelsius, errorLow, errorHigh, printed], index) => ({
    type: type as LetterType,
    index,
    lowCelsius,
    highCelsius,
    errorLow,
    errorHigh,
    printed,
  })),
)
