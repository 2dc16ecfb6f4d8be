import type { Compensation, CompensationKind } from '#shared/thermometry/run'

/** What each kind of compensation means to the reading, beside the choice. */
export const COMPENSATION_HINTS: Record<CompensationKind, string> = {
  internal: 'A sensor at the display’s own terminals; the usual kind.',
  'remote-block':
    'The thermocouple conductors end at a reference block in the run; copper leads on from there.',
  fixed: 'The display takes its terminals to be at one temperature, whatever they are.',
  none: 'The display takes its terminals to be at 0 °C and reads low by about what they are.',
  'adds-degrees': 'Converts the bare emf and adds degrees; misses what the curve bends.',
  zeroed: 'A gauge whose pointer was set to the ambient temperature with the circuit open.',
}

/** The one number of a compensation: sensor offset (kelvin) or temperature (°C). */
export function compensationOf(compensation: Compensation): number | null {
  switch (compensation.kind) {
    case 'internal':
    case 'remote-block':
    case 'adds-degrees':
      return compensation.sensorOffsetKelvin
    case 'fixed':
      return compensation.celsius
    case 'zeroed':
      return compensation.ambientCelsius
    case 'none':
      return 0
  }
}

/** A compensation of the chosen kind. An empty number stays no number, for the schema to refuse. */
export function toCompensation(kind: CompensationKind, value: number | null): Compensation {
  const number = value ?? Number.NaN
  switch (kind) {
    case 'internal':
    case 'remote-block':
    case 'adds-degrees':
      return { kind, sensorOffsetKelvin: number }
    case 'fixed':
      return { kind, celsius: number }
    case 'zeroed':
      return { kind, ambientCelsius: number }
    case 'none':
      return { kind }
  }
}
