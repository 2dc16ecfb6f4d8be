import type { Preferences } from '../schemas/account'
import type { Figure } from './figure'
import { formatNumber } from './number'

export type GaugeUnit = Preferences['gaugeUnit']

/**
 * Cross-section of a solid conductor of a whole American Wire Gauge number.
 *
 * d = 0.127 mm · 92^((36 − n)/39).
 *
 * @param awg 0 to 40
 * @returns mm²
 * @see ASTM B258, Standard nominal diameters and cross-sectional areas of AWG sizes
 */
export function squareMillimetresFromAwg(awg: number): number {
  const millimetres = 0.127 * 92 ** ((36 - awg) / 39)
  return (Math.PI / 4) * millimetres ** 2
}

/** A gauge as figure and unit; mm² to three significant digits. */
export function gaugeFigure(awg: number, unit: GaugeUnit): Figure {
  if (unit === 'awg') return { value: formatNumber(awg, 0), unit: 'AWG' }
  const area = squareMillimetresFromAwg(awg)
  return { value: area.toPrecision(3), unit: 'mm²' }
}
