import type { Preferences } from '../schemas/account'
import type { Figure } from './figure'
import { formatNumber } from './number'

export type LengthUnit = Preferences['lengthUnit']

/** Metres in one international foot, exact by definition (1959). */
const METRES_PER_FOOT = 0.3048

const SYMBOL: Record<LengthUnit, string> = { metre: 'm', foot: 'ft' }

/** `m` or `ft`. */
export function lengthSymbol(unit: LengthUnit): string {
  return SYMBOL[unit]
}

/** Metres to the unit shown. */
export function fromMetres(metres: number, unit: LengthUnit): number {
  return unit === 'metre' ? metres : metres / METRES_PER_FOOT
}

/** The unit shown to metres. */
export function toMetres(value: number, unit: LengthUnit): number {
  return unit === 'metre' ? value : value * METRES_PER_FOOT
}

/** A length as figure and unit. */
export function lengthFigure(metres: number, unit: LengthUnit, decimals = 2): Figure {
  return { value: formatNumber(fromMetres(metres, unit), decimals), unit: SYMBOL[unit] }
}
