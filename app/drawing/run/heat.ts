import type { HeatStep } from './types'

/** Below the first of these a zone is cold to the hand; above the last it glows, °C. */
const STEPS_CELSIUS = [15, 35, 70, 140, 280, 550] as const

/** Step of the heat ramp for a temperature. */
export function heatStep(celsius: number): HeatStep {
  return STEPS_CELSIUS.filter((step) => celsius >= step).length as HeatStep
}
