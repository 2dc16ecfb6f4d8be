import {
  differenceFigure,
  figureText,
  formatNumber,
  formatSigned,
  lengthFigure,
  microvoltFigure,
  millivoltFigure,
  signedMillivoltFigure,
  temperatureFigure,
  temperatureSymbol,
  fromKelvin,
} from '../../units'
import type { ShownUnits } from './types'

/** Figures with their unit, as text for sentences and drawings. */
export interface FigureWords {
  temperature: (celsius: number) => string
  /** With its sign: +20.1 °C. */
  difference: (kelvin: number) => string
  /** Without a sign, for "too high by". */
  degrees: (kelvin: number) => string
  microvolts: (microvolts: number) => string
  millivolts: (millivolts: number) => string
  signedMillivolts: (millivolts: number) => string
  length: (metres: number) => string
  percent: (fraction: number) => string
}

/** Writes figures in the units a person chose. Input in °C, kelvin, mV, µV and metres. */
export function figureWords({ temperatureUnit, lengthUnit }: ShownUnits): FigureWords {
  return {
    temperature: (celsius) => figureText(temperatureFigure(celsius, temperatureUnit)),
    difference: (kelvin) => figureText(differenceFigure(kelvin, temperatureUnit)),
    degrees: (kelvin) =>
      figureText({
        value: formatNumber(Math.abs(fromKelvin(kelvin, temperatureUnit)), 1),
        unit: temperatureSymbol(temperatureUnit),
      }),
    microvolts: (microvolts) => figureText(microvoltFigure(microvolts)),
    millivolts: (millivolts) => figureText(millivoltFigure(millivolts)),
    signedMillivolts: (millivolts) => figureText(signedMillivoltFigure(millivolts)),
    length: (metres) => figureText(lengthFigure(metres, lengthUnit)),
    percent: (fraction) => figureText({ value: formatSigned(fraction * 100, 2), unit: '%' }),
  }
}
