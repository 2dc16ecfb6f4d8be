import type { LetterType } from '../its90'
import { letterTypeRange } from '../its90'
import { platinumLegRange } from './emfAgainstPlatinum67'
import type { Thermoelement } from './ids'
import { isMagnetic } from './magnetism'
import { OTHER_METALS_AGAINST_PLATINUM, OTHER_METALS_STEP_KELVIN } from './otherMetals'
import type { OtherMetal } from './otherMetals'
import { SINGLE_LEG_FUNCTIONS } from './singleLegs'

const LETTER_FUNCTIONS = 'ITS-90 reference functions, NIST Monograph 175'
const SINGLE_LEGS = 'single-leg tables against Pt-67, NIST Monograph 175'
const RECALLED = 'handbook table against platinum, from memory'

export interface ThermoelementInfo {
  id: Thermoelement
  /** Short text that stands on the conductor in a drawing. */
  symbol: string
  /** The alloy in words. */
  name: string
  /** Letter type and leg, for the conductors of a letter type. */
  letter: { type: LetterType; leg: 'positive' | 'negative' } | null
  lowCelsius: number
  highCelsius: number
  source: string
  /** True where at least two independent copies of the figures agreed. */
  verified: boolean
  /** Whether a magnet attracts it at room temperature; undefined where that is not known or depends on its working. */
  magnetic: boolean | undefined
}

interface Range {
  lowCelsius: number
  highCelsius: number
}

function overlap(...ranges: readonly Range[]): Range {
  return {
    lowCelsius: Math.max(...ranges.map(({ lowCelsius }) => lowCelsius)),
    highCelsius: Math.min(...ranges.map(({ highCelsius }) => highCelsius)),
  }
}

const E = letterTypeRange('E')
const RANGES = {
  E,
  EK: overlap(E, letterTypeRange('K')),
  T: letterTypeRange('T'),
  J: overlap(platinumLegRange('JP'), platinumLegRange('EN')),
  N: overlap(platinumLegRange('NP'), platinumLegRange('EN')),
  R: overlap(letterTypeRange('R'), platinumLegRange('EN')),
  S: overlap(letterTypeRange('S'), platinumLegRange('EN')),
  B: overlap(platinumLegRange('BP'), platinumLegRange('EN')),
}

type LegId = Exclude<Thermoelement, OtherMetal>

const LEGS: Record<LegId, readonly [name: string, range: Range, source: string, verified: boolean]> = {
  KP: ['nickel-chromium', RANGES.E, LETTER_FUNCTIONS, true],
  KN: ['nickel-aluminium', RANGES.EK, LETTER_FUNCTIONS, true],
  EP: ['nickel-chromium', RANGES.E, LETTER_FUNCTIONS, true],
  EN: ['copper-nickel (constantan of E and T)', RANGES.E, LETTER_FUNCTIONS, true],
  JP: ['iron', RANGES.J, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.JP.verified],
  JN: ['copper-nickel (constantan of J)', RANGES.J, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.JN.verified],
  TP: ['copper', RANGES.T, LETTER_FUNCTIONS, true],
  TN: ['copper-nickel (constantan of E and T)', RANGES.E, LETTER_FUNCTIONS, true],
  NP: ['nickel-chromium-silicon', RANGES.N, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.NP.verified],
  NN: ['nickel-silicon', RANGES.N, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.NN.verified],
  RP: ['platinum-13 % rhodium', RANGES.R, SINGLE_LEGS, true],
  RN: ['platinum', RANGES.R, SINGLE_LEGS, true],
  SP: ['platinum-10 % rhodium', RANGES.S, SINGLE_LEGS, true],
  SN: ['platinum', RANGES.R, SINGLE_LEGS, true],
  BP: ['platinum-30 % rhodium', RANGES.B, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.BP.verified],
  BN: ['platinum-6 % rhodium', RANGES.B, SINGLE_LEGS, SINGLE_LEG_FUNCTIONS.BN.verified],
  Cu: ['copper', RANGES.T, LETTER_FUNCTIONS, true],
}

const METALS: Record<OtherMetal, readonly [symbol: string, name: string]> = {
  aluminium: ['Al', 'aluminium'],
  'beryllium-copper': ['CuBe', 'beryllium copper'],
  brass: ['Brass', 'brass'],
  gold: ['Au', 'gold'],
  iron: ['Fe', 'iron (not thermocouple grade)'],
  lead: ['Pb', 'lead'],
  manganin: ['CuMnNi', 'copper-manganese-nickel'],
  nickel: ['Ni', 'nickel'],
  'nickel-chromium-80-20': ['NiCr 80/20', 'nickel-chromium 80/20'],
  'nickel-chromium-iron-60-16-24': ['NiCrFe', 'nickel-chromium-iron 60/16/24'],
  'phosphor-bronze': ['CuSn', 'phosphor bronze'],
  silver: ['Ag', 'silver'],
  'spring-steel': ['Spring st.', 'spring steel'],
  'stainless-steel-18-8': ['Stainless', 'stainless steel 18/8'],
  tin: ['Sn', 'tin'],
  'tin-lead-solder': ['SnPb', 'solder, tin-lead 50/50'],
  'tin-silver-solder': ['SnAg', 'solder, tin-silver 96.5/3.5'],
  tungsten: ['W', 'tungsten'],
  zinc: ['Zn', 'zinc'],
}

export function isOtherMetal(element: Thermoelement): element is OtherMetal {
  return Object.hasOwn(OTHER_METALS_AGAINST_PLATINUM, element)
}

function legInfo(id: LegId): ThermoelementInfo {
  const [name, { lowCelsius, highCelsius }, source, verified] = LEGS[id]
  const letter =
    id === 'Cu'
      ? null
      : {
          type: id.charAt(0) as LetterType,
          leg: id.endsWith('P') ? ('positive' as const) : ('negative' as const),
        }
  return { id, symbol: id, name, letter, lowCelsius, highCelsius, source, verified, magnetic: isMagnetic(id) }
}

function metalInfo(id: OtherMetal): ThermoelementInfo {
  const [symbol, name] = METALS[id]
  const highCelsius = (OTHER_METALS_AGAINST_PLATINUM[id].length - 1) * OTHER_METALS_STEP_KELVIN
  const range = { lowCelsius: 0, highCelsius }
  return {
    id,
    symbol,
    name,
    letter: null,
    ...range,
    source: RECALLED,
    verified: false,
    magnetic: isMagnetic(id),
  }
}

/** What a conductor is, and where its data hold (°C). */
export function thermoelementInfo(id: Thermoelement): ThermoelementInfo {
  return isOtherMetal(id) ? metalInfo(id) : legInfo(id)
}
