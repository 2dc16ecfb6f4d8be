import type { Thermoelement } from '#shared/thermometry/thermoelements'
import {
  thermoelementMillivolts,
  thermoelementSensitivityMillivoltsPerKelvin,
} from '#shared/thermometry/thermoelements'
import type { Comparison } from '../comparison'
import { halfOf, plusMinus } from '../comparison'
import { copperAgainstPlatinum } from '../published/absoluteSeebeck'
import type { Values } from '../published/conductors'
import {
  COPPER_TO_METAL,
  HANDBOOK,
  KP_DATASHEET,
  KP_DATASHEET_COARSE,
  SERIES_AT_100,
  SERIES_AT_100_SCATTERED,
} from '../published/conductors'

function againstPlatinum(element: Thermoelement, celsius: number): number {
  return thermoelementMillivolts(element, celsius) - thermoelementMillivolts('RN', celsius)
}

function pointsOf(element: Thermoelement, values: Values) {
  return values.map(([celsius, published]) => ({
    celsius,
    computed: againstPlatinum(element, celsius),
    published,
  }))
}

const DATASHEET = 'published emf datasheet of KP/EP wire against Pt-67'

const datasheet: readonly Comparison[] = [
  {
    title: 'KP against platinum, 100 to 300 °C',
    source: DATASHEET,
    unit: 'mV',
    allowed: halfOf(0.001),
    count: 3,
    points: () => pointsOf('KP', KP_DATASHEET),
  },
  {
    title: 'KP against platinum, 400 °C',
    source: DATASHEET,
    unit: 'mV',
    allowed: halfOf(0.01),
    count: 1,
    points: () => pointsOf('KP', KP_DATASHEET_COARSE),
  },
]

const handbook: readonly Comparison[] = HANDBOOK.map(([element, values]) => ({
  title: `${element} against platinum, 100 to 400 °C`,
  source: 'handbook table of metals against platinum, from memory, unverified',
  unit: 'mV',
  allowed: plusMinus(0.015),
  count: 4,
  points: () => pointsOf(element, values),
}))

const CELSIUS = [-50, -25, 25, 50, 100, 150, 200, 250, 300, 350, 400]

const absolute: Comparison = {
  title: 'copper against platinum, −50 to 400 °C',
  source: 'absolute Seebeck coefficients, interpolation formulas of Burkov et al. (2001), read from a copy',
  unit: 'mV',
  allowed: plusMinus(0.015),
  count: CELSIUS.length,
  points: () =>
    CELSIUS.map((celsius) => ({
      celsius,
      computed: againstPlatinum('Cu', celsius),
      published: copperAgainstPlatinum(celsius),
    })),
}

function series(title: string, rows: typeof SERIES_AT_100, limit: number): Comparison {
  return {
    title,
    source: 'thermoelectric series at 100 °C quoted in a workshop reference, unverified',
    unit: 'mV',
    allowed: plusMinus(limit),
    count: rows.length,
    points: () => rows.flatMap(([element, value]) => pointsOf(element, [[100, value]])),
  }
}

const ROOM_CELSIUS = 20

/** Both sides are rough: a metal whose sign or decimal point had slipped in the handbook table would stand out. */
const copperToMetal: Comparison = {
  title: 'copper to other metals near room temperature',
  source: 'approximate table in the user guides of digital multimeters; magnitudes alone',
  unit: 'µV/K',
  allowed: plusMinus(4.5),
  count: COPPER_TO_METAL.length,
  points: () =>
    COPPER_TO_METAL.map(([element, published]) => {
      const sensitivity = (of: Thermoelement) =>
        thermoelementSensitivityMillivoltsPerKelvin(of, ROOM_CELSIUS) * 1000
      const computed = Math.abs(sensitivity(element) - sensitivity('Cu'))
      return { celsius: ROOM_CELSIUS, computed, published }
    }),
}

/** Single conductors against figures from other sources than Monograph 175. */
export const conductors: readonly Comparison[] = [
  ...datasheet,
  ...handbook,
  absolute,
  series('metals against platinum, 100 °C', SERIES_AT_100, 0.15),
  series('metals that vary with purity and alloy against platinum, 100 °C', SERIES_AT_100_SCATTERED, 0.55),
  copperToMetal,
]
