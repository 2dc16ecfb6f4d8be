import type { Channel, ExpectedReading } from '#shared/types/workbook'

/** Records as they come from the database, for tests that need none. */

export function channelRecord(changes: Partial<Channel> = {}): Channel {
  return {
    id: 1,
    version: 1,
    position: 0,
    tag: 'EGT 1',
    quantity: 'exhaust-gas-temperature',
    cylinder: 1,
    sensor: 'thermocouple',
    thermocoupleType: 'K',
    tipZoneId: 1,
    displayId: 1,
    inputNumber: 1,
    typeSetting: 'K',
    workingLowCelsius: null,
    workingHighCelsius: null,
    notes: '',
    ...changes,
  }
}

export function readingRecord(changes: Partial<ExpectedReading> = {}): ExpectedReading {
  return {
    channelId: 1,
    stateId: 1,
    tipCelsius: 700,
    terminalMillivolts: 28,
    indication: { kind: 'value', celsius: 700 },
    errorKelvin: 0,
    findingCodes: [],
    ...changes,
  }
}
