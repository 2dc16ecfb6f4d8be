import type { CreateAircraftInput } from '#shared/schemas/aircraft'
import type { CreateDisplayInput } from '#shared/schemas/display'
import type { LetterType } from '#shared/thermometry/its90'

/** An invented four-cylinder, air-cooled two-seater. */
export const DEMO_AIRCRAFT: CreateAircraftInput = {
  name: 'Thistledown two-seat',
  registration: 'DEMO',
  cableStandard: 'astm-e230',
  displayName: 'Engine monitor',
  layout: {
    cylinders: 4,
    cooling: 'air',
    ignition: 'two-magnetos',
    quantities: [
      'exhaust-gas-temperature',
      'cylinder-head-temperature',
      'oil-temperature',
      'intake-air-temperature',
      'outside-air-temperature',
      'oil-pressure',
      'fuel-flow',
      'manifold-pressure',
      'engine-speed',
      'bus-voltage',
    ],
  },
}

/** Wrong as built: its cold-junction sensor reads 4 K above the terminals, so both its channels read high. */
export const DEMO_AIR_GAUGE: Omit<CreateDisplayInput, 'terminalZoneId'> & { channels: readonly string[] } = {
  name: 'Air temperature gauge',
  inputs: 2,
  compensation: { kind: 'internal', sensorOffsetKelvin: 4 },
  gainErrorFraction: 0,
  offsetKelvin: 0,
  lowCelsius: -50,
  highCelsius: 150,
  notes: 'Second-hand gauge. Its cold-junction sensor sits beside the lamp.',
  channels: ['INTAKE AIR', 'OAT'],
}

/** Wrong as built: the display's factory setting for cylinder heads was left as it came. */
export const DEMO_TYPE_SETTINGS: readonly { tag: string; typeSetting: LetterType }[] = [
  { tag: 'CHT 4', typeSetting: 'J' },
]

/** No two cylinders run alike: what was seen on the running engine, °C. */
export const DEMO_TEMPERATURES: readonly { state: string; zone: string; celsius: number }[] = [
  { state: 'Climb', zone: 'Exhaust 1', celsius: 676 },
  { state: 'Climb', zone: 'Exhaust 3', celsius: 704 },
  { state: 'Climb', zone: 'Exhaust 4', celsius: 697 },
  { state: 'Climb', zone: 'Cylinder head 1', celsius: 191 },
  { state: 'Climb', zone: 'Cylinder head 3', celsius: 211 },
  { state: 'Climb', zone: 'Cylinder head 4', celsius: 204 },
  { state: 'Cruise', zone: 'Exhaust 1', celsius: 728 },
  { state: 'Cruise', zone: 'Exhaust 3', celsius: 752 },
  { state: 'Cruise', zone: 'Exhaust 4', celsius: 746 },
  { state: 'Cruise', zone: 'Cylinder head 1', celsius: 168 },
  { state: 'Cruise', zone: 'Cylinder head 3', celsius: 184 },
  { state: 'Cruise', zone: 'Cylinder head 4', celsius: 178 },
]
