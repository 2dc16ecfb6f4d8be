import type { Figure } from './figure'
import { formatNumber, formatSigned } from './number'

/** An emf, mV, to the last digit of the published tables unless more is asked for. */
export function millivoltFigure(millivolts: number, decimals = 3): Figure {
  return { value: formatNumber(millivolts, decimals), unit: 'mV' }
}

/** An emf with its sign, mV: what a part of a circuit adds. */
export function signedMillivoltFigure(millivolts: number, decimals = 3): Figure {
  return { value: formatSigned(millivolts, decimals), unit: 'mV' }
}

/** A small emf with its sign, µV. */
export function microvoltFigure(microvolts: number, decimals = 0): Figure {
  return { value: formatSigned(microvolts, decimals), unit: 'µV' }
}
