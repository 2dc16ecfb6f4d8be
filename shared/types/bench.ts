import type { LetterType } from '../thermometry/its90'

/** GET /api/bench/thermocouple: both directions answer in the same shape. */
export interface ThermocoupleAnswer {
  type: LetterType
  /** Tip temperature, °C. */
  celsius: number
  coldJunctionCelsius: number
  /** emf at the terminals: E(celsius) − E(coldJunctionCelsius), mV. */
  millivolts: number
  /** dE/dT at the tip temperature, mV/K. */
  sensitivityMillivoltsPerKelvin: number
  range: { lowCelsius: number; highCelsius: number }
  source: string
}
