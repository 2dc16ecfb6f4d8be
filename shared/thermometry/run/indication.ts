import type { LetterType } from '../its90'
import { celsiusFromMillivolts, emfMillivolts, inverseRange, letterTypeRange } from '../its90'
import type { Compensation, DisplayInput, Indication } from './types'

/**
 * The temperature the display takes its reference point to be at, °C.
 *
 * @param referenceCelsius true temperature of the reference point
 */
export function compensationCelsius(compensation: Compensation, referenceCelsius: number): number {
  switch (compensation.kind) {
    case 'internal':
    case 'remote-block':
    case 'adds-degrees':
      return referenceCelsius + compensation.sensorOffsetKelvin
    case 'fixed':
      return compensation.celsius
    case 'zeroed':
      return compensation.ambientCelsius
    case 'none':
      return 0
  }
}

/** emf the display adds before it converts, mV; null where its type has no value at that temperature. */
export function compensationMillivolts(display: DisplayInput, celsius: number): number | null {
  if (display.compensation.kind === 'adds-degrees') return 0
  const { lowCelsius, highCelsius } = letterTypeRange(display.typeSetting)
  if (celsius < lowCelsius || celsius > highCelsius) return null
  return emfMillivolts(display.typeSetting, celsius)
}

function convert(type: LetterType, millivolts: number): Indication {
  const range = inverseRange(type)
  if (millivolts <= range.lowMillivolts) return { kind: 'off-scale-low', limitCelsius: range.lowCelsius }
  if (millivolts > range.highMillivolts) return { kind: 'off-scale-high', limitCelsius: range.highCelsius }
  return { kind: 'value', celsius: celsiusFromMillivolts(type, millivolts) }
}

/**
 * What the display shows for an emf at its terminals: E_D⁻¹(V + E_D(T_comp)), D being the type it is set to, in
 * both terms; then its gain and offset errors; then its scale.
 *
 * @param terminalMillivolts emf at the terminals, mV; null when it could not be worked out
 * @param referenceCelsius true temperature of the reference point, °C
 */
export function indicate(
  terminalMillivolts: number | null,
  display: DisplayInput,
  referenceCelsius: number,
): Indication {
  const celsius = compensationCelsius(display.compensation, referenceCelsius)
  const added = compensationMillivolts(display, celsius)
  if (terminalMillivolts === null || added === null) return { kind: 'withheld' }
  const converted = convert(display.typeSetting, terminalMillivolts + added)
  if (converted.kind !== 'value') return converted
  const addedDegrees = display.compensation.kind === 'adds-degrees' ? celsius : 0
  const shown = (converted.celsius + addedDegrees) * (1 + display.gainErrorFraction) + display.offsetKelvin
  if (display.lowCelsius !== null && shown < display.lowCelsius)
    return { kind: 'off-scale-low', limitCelsius: display.lowCelsius }
  if (display.highCelsius !== null && shown > display.highCelsius)
    return { kind: 'off-scale-high', limitCelsius: display.highCelsius }
  return { kind: 'value', celsius: shown }
}

/** Indicated minus tip, kelvin; null when the display shows no value. */
export function indicationError(indication: Indication, tipCelsius: number): number | null {
  return indication.kind === 'value' ? indication.celsius - tipCelsius : null
}
