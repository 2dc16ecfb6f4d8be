import type { Thermoelement } from '#shared/thermometry/thermoelements'

/** mV by °C. */
export type Values = readonly (readonly [celsius: number, millivolts: number])[]

/** Source: published emf datasheet of KP/EP wire against Pt-67, reference at 0 °C, printed to 0.001 mV. */
export const KP_DATASHEET: Values = [
  [100, 2.814],
  [200, 5.97],
  [300, 9.323],
]

/** The same sheet, the value it prints to 0.01 mV. */
export const KP_DATASHEET_COARSE: Values = [[400, 12.76]]

function atHundreds(...values: readonly [number, number, number, number]): Values {
  return values.map((value, i) => [100 * (i + 1), value] as const)
}

/**
 * Source: NBS table of metals against platinum (Roeser and Wensel) as the physics handbooks reproduce it. From
 * memory and unverified. Its iron is another iron than JP, and is not compared with it.
 */
export const HANDBOOK: readonly (readonly [Thermoelement, Values])[] = [
  ['Cu', atHundreds(0.76, 1.83, 3.15, 4.68)],
  ['EN', atHundreds(-3.51, -7.45, -11.71, -16.19)],
  ['KP', atHundreds(2.81, 5.96, 9.32, 12.75)],
  ['KN', atHundreds(-1.29, -2.17, -2.89, -3.64)],
]

/**
 * Metals against platinum at 100 °C, mV. Source: a thermoelectric series quoted in a German workshop reference,
 * unverified.
 */
export const SERIES_AT_100: readonly (readonly [Thermoelement, number])[] = [
  ['iron', 1.9],
  ['Cu', 0.75],
  ['silver', 0.7],
  ['gold', 0.7],
  ['zinc', 0.7],
  ['manganin', 0.68],
  ['phosphor-bronze', 0.52],
  ['lead', 0.45],
  ['aluminium', 0.4],
  ['nickel', -1.55],
  ['EN', -3.5],
]

/** The same series where it is far from the handbook table: tungsten by purity, brass and 18/8 steel by alloy. */
export const SERIES_AT_100_SCATTERED: readonly (readonly [Thermoelement, number])[] = [
  ['tungsten', 0.8],
  ['brass', 1.1],
  ['stainless-steel-18-8', 0.8],
]

/**
 * Copper to another metal near room temperature, µV/K, magnitude alone. Source: "thermal EMF errors" table printed in
 * the user guides of several digital multimeters, where it is called approximate; four copies agree.
 */
export const COPPER_TO_METAL: readonly (readonly [Thermoelement, number])[] = [
  ['gold', 0.5],
  ['silver', 0.5],
  ['brass', 3],
  ['beryllium-copper', 5],
  ['aluminium', 5],
  ['tin-lead-solder', 5],
]
