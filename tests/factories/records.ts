import type { CreateAircraftInput } from '#shared/schemas/aircraft'
import type { ChannelFields } from '#shared/schemas/channel'
import type { CreateDisplayInput } from '#shared/schemas/display'
import type { LogProbeInput } from '#shared/schemas/probe'
import type { WiringRunInput } from '#shared/schemas/run'

/** Requests that are right as they stand; a test says only what it is about. */

export function aircraftInput(changes: Partial<CreateAircraftInput> = {}): CreateAircraftInput {
  return {
    name: 'Test two-seat',
    registration: 'TEST-1',
    cableStandard: 'astm-e230',
    displayName: 'Engine monitor',
    layout: {
      cylinders: 2,
      cooling: 'air',
      ignition: 'two-magnetos',
      quantities: ['exhaust-gas-temperature', 'cylinder-head-temperature', 'oil-pressure'],
    },
    ...changes,
  }
}

export function displayInput(
  terminalZoneId: number,
  changes: Partial<CreateDisplayInput> = {},
): CreateDisplayInput {
  return {
    name: 'Second gauge',
    inputs: 4,
    terminalZoneId,
    compensation: { kind: 'internal', sensorOffsetKelvin: 0 },
    gainErrorFraction: 0,
    offsetKelvin: 0,
    lowCelsius: null,
    highCelsius: null,
    notes: '',
    ...changes,
  }
}

export function thermocoupleInput(tipZoneId: number, changes: Partial<ChannelFields> = {}): ChannelFields {
  return {
    tag: 'TEMP 9',
    quantity: 'other-temperature',
    cylinder: null,
    sensor: 'thermocouple',
    thermocoupleType: 'K',
    tipZoneId,
    displayId: null,
    inputNumber: null,
    typeSetting: null,
    workingLowCelsius: null,
    workingHighCelsius: null,
    notes: '',
    ...changes,
  }
}

export function probeInput(changes: Partial<LogProbeInput> = {}): LogProbeInput {
  return {
    version: null,
    marking: 'P-001',
    thermocoupleType: 'K',
    tipStyle: 'grounded',
    style: 'clamp',
    leadLengthMetres: 0.9,
    notes: '',
    ...changes,
  }
}

/** Probe, plug pair in the zone given, extension of the conductors given, terminals. */
export function runInput(
  plugZoneId: number,
  extension: Partial<WiringRunInput['sections'][number]> = {},
): WiringRunInput {
  const pair = { positive: 'KP', negative: 'KN', lengthMetres: 1.2, gaugeAwg: 20 } as const
  return {
    sections: [
      { ...pair, id: 'probe', label: 'Probe lead' },
      { ...pair, id: 'extension', label: 'Extension', ...extension },
    ],
    joints: [
      {
        id: 'plug',
        label: 'Plug pair',
        kind: 'plug-pair',
        tipSideZone: String(plugZoneId),
        displaySideZone: String(plugZoneId),
        crossed: false,
        positiveMetal: null,
        negativeMetal: null,
        positiveOffsetKelvin: 0,
        negativeOffsetKelvin: 0,
      },
    ],
    terminals: { crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
  }
}
