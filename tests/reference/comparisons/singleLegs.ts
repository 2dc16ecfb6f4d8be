import type { PlatinumLeg, Thermoelement } from '#shared/thermometry/thermoelements'
import type { LetterType } from '#shared/thermometry/its90'
import { emfAgainstPlatinum67, thermoelementMillivolts } from '#shared/thermometry/thermoelements'
import type { Comparison } from '../comparison'
import { everyDegree, halfOf, plusMinus } from '../comparison'
import { LETTER_TABLES } from '../published/letterTables'

function legDifference(positive: PlatinumLeg, negative: PlatinumLeg, celsius: number): number {
  return emfAgainstPlatinum67(positive, celsius) - emfAgainstPlatinum67(negative, celsius)
}

type PairRow = readonly [LetterType, PlatinumLeg, PlatinumLeg, lowCelsius: number, highCelsius: number]

const PAIRS: readonly PairRow[] = [
  ['K', 'KP', 'KN', -270, 1372],
  ['E', 'KP', 'EN', -270, 1000],
  ['T', 'TP', 'EN', -270, 400],
  ['J', 'JP', 'JN', -210, 760],
  ['N', 'NP', 'NN', -270, 1300],
  ['B', 'BP', 'BN', 0, 1768],
]

/** Two single-leg functions make their letter type: polynomials on one side, printed tables on the other. */
export const legPairs: readonly Comparison[] = PAIRS.map(([type, positive, negative, low, high]) => ({
  title: `${positive} − ${negative} against platinum is type ${type}, every 1 °C`,
  source: `single-leg functions of Monograph 175 against the printed table of type ${type}, NIST SRD 60`,
  unit: 'mV',
  allowed: halfOf(0.001),
  count: high - low + 1,
  points: () =>
    everyDegree(low, high).map((celsius) => ({
      celsius,
      computed: legDifference(positive, negative, celsius),
      published: LETTER_TABLES[type].get(celsius) ?? Number.NaN,
    })),
}))

type CrossRow = readonly [
  letters: string,
  Thermoelement & PlatinumLeg,
  Thermoelement & PlatinumLeg,
  highCelsius: number,
]

const CROSSED: readonly CrossRow[] = [
  ['E − T', 'KP', 'TP', 400],
  ['E − T − K', 'KN', 'TP', 400],
  ['E − K', 'KN', 'EN', 1000],
]

/**
 * Conductors of different types: letter functions alone on one side, single-leg functions on the other. KN, EN and TP
 * were mended where the copy of their tables was mistyped, so that they close with the letter functions: this shows
 * that both sets are typed in rightly, the comparison with tables from elsewhere that they are right.
 */
export const crossedLegs: readonly Comparison[] = CROSSED.map(([letters, positive, negative, high]) => ({
  title: `${positive} − ${negative} as ${letters}, every 1 °C`,
  source: 'letter functions against single-leg functions, both of Monograph 175',
  unit: 'mV',
  allowed: plusMinus(1e-6),
  count: high + 270 + 1,
  points: () =>
    everyDegree(-270, high).map((celsius) => ({
      celsius,
      computed: thermoelementMillivolts(positive, celsius) - thermoelementMillivolts(negative, celsius),
      published: legDifference(positive, negative, celsius),
    })),
}))
