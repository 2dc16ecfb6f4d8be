import type { LetterType } from '#shared/thermometry/its90'
import { LETTER_TYPES, emfMillivolts } from '#shared/thermometry/its90'
import { REFERENCE_FUNCTIONS } from '#shared/thermometry/its90/coefficients'
import { polynomial } from '#shared/thermometry/its90/polynomial'
import type { Comparison } from '../comparison'
import { halfOf } from '../comparison'
import { INVERSE_BANDS } from '../published/inverseBands'
import { LETTER_TABLES } from '../published/letterTables'

/** Whole degrees of each type's range, both ends included. */
const TABLE_ENTRIES: Record<LetterType, number> = {
  B: 1821,
  E: 1271,
  J: 1411,
  K: 1643,
  N: 1571,
  R: 1819,
  S: 1819,
  T: 671,
}

/** Every entry of the printed tables. */
export const letterTables: readonly Comparison[] = LETTER_TYPES.map((type) => ({
  title: `type ${type} reference function, every 1 °C`,
  source: 'printed table, NIST Standard Reference Database 60 (Monograph 175)',
  unit: 'mV',
  allowed: halfOf(0.001),
  count: TABLE_ENTRIES[type],
  points: () =>
    [...LETTER_TABLES[type]].map(([celsius, published]) => ({
      celsius,
      computed: emfMillivolts(type, celsius),
      published,
    })),
}))

const SAMPLES = 1001

/** The published inverse functions, of which the conversion takes its first guess, within their printed errors. */
export const inverseFunctions: readonly Comparison[] = INVERSE_BANDS.map((band) => ({
  title: `type ${band.type} inverse function, ${band.lowCelsius} to ${band.highCelsius} °C`,
  source: 'printed error band, NIST Standard Reference Database 60; judged to half its last digit',
  unit: 'K',
  allowed: { low: band.errorLow - band.printed / 2, high: band.errorHigh + band.printed / 2 },
  count: SAMPLES,
  points: () =>
    Array.from({ length: SAMPLES }, (_, i) => {
      const celsius = band.lowCelsius + ((band.highCelsius - band.lowCelsius) * i) / (SAMPLES - 1)
      const inverse = REFERENCE_FUNCTIONS[band.type].inverse[band.index]
      const computed = polynomial(inverse?.coefficients ?? [], emfMillivolts(band.type, celsius))
      return { celsius, computed, published: celsius }
    }),
}))
