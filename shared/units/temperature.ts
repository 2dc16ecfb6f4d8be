import type { Preferences } from '../schemas/account'
import { formatNumber, formatSigned } from './number'
import type { Figure } from './figure'

export type TemperatureUnit = Preferences['temperatureUnit']

const SYMBOL: Record<TemperatureUnit, string> = { celsius: '°C', fahrenheit: '°F' }

/** `°C` or `°F`. */
export function temperatureSymbol(unit: TemperatureUnit): string {
  return SYMBOL[unit]
}

/** °C to the unit shown. */
export function fromCelsius(celsius: number, unit: TemperatureUnit): number {
  return unit === 'celsius' ? celsius : celsius * 1.8 + 32
}

/** The unit shown to °C. */
export function toCelsius(value: number, unit: TemperatureUnit): number {
  return unit === 'celsius' ? value : (value - 32) / 1.8
}

/** Kelvin to degrees of the unit shown: a difference or tolerance carries no 32° offset. */
export function fromKelvin(kelvin: number, unit: TemperatureUnit): number {
  return unit === 'celsius' ? kelvin : kelvin * 1.8
}

/** Degrees of the unit shown to kelvin, for a difference or tolerance. */
export function toKelvin(value: number, unit: TemperatureUnit): number {
  return unit === 'celsius' ? value : value / 1.8
}

/** A temperature as figure and unit. */
export function temperatureFigure(celsius: number, unit: TemperatureUnit, decimals = 1): Figure {
  return { value: formatNumber(fromCelsius(celsius, unit), decimals), unit: SYMBOL[unit] }
}

/** A temperature difference as signed figure and unit. */
export function differenceFigure(kelvin: number, unit: TemperatureUnit, decimals = 1): Figure {
  return { value: formatSigned(fromKelvin(kelvin, unit), decimals), unit: SYMBOL[unit] }
}
