import type { EngineLayout, Quantity } from '../../schemas/aircraft'
import { QUANTITIES } from '../../schemas/aircraft'
import type { Sensor } from '../../schemas/channel'
import type { LetterType } from '../../thermometry/its90'
import type { LaidOutChannel } from './types'
import { cylinderNumbers, cylinderZone } from './zones'

/** One type for the whole aircraft: one kind of cable to buy, and no input that needs another setting. */
const PLANNED_TYPE: LetterType = 'K'

type Planned = Pick<LaidOutChannel, 'tag' | 'cylinder' | 'sensor' | 'tipZone'>

/** One channel for each source of ignition signal, because each has to be seen dropping on its own. */
const ENGINE_SPEED_TAGS: Readonly<Record<EngineLayout['ignition'], readonly string[]>> = {
  'two-magnetos': ['RPM L', 'RPM R'],
  'magneto-and-electronic': ['RPM MAG', 'RPM EI'],
  'two-electronic': ['RPM A', 'RPM B'],
}

function perCylinder(prefix: string, kind: 'exhaust' | 'cylinder-head') {
  return ({ cylinders }: EngineLayout): Planned[] =>
    cylinderNumbers(cylinders).map((cylinder) => ({
      tag: `${prefix} ${cylinder}`,
      cylinder,
      sensor: 'thermocouple',
      tipZone: cylinderZone(kind, cylinder),
    }))
}

function thermocouple(tag: string, tipZone: string) {
  return (): Planned[] => [{ tag, cylinder: null, sensor: 'thermocouple', tipZone }]
}

function sender(sensor: Sensor, tag: string) {
  return (): Planned[] => [{ tag, cylinder: null, sensor, tipZone: null }]
}

const PLANS: Readonly<Record<Quantity, (layout: EngineLayout) => Planned[]>> = {
  'exhaust-gas-temperature': perCylinder('EGT', 'exhaust'),
  'cylinder-head-temperature': perCylinder('CHT', 'cylinder-head'),
  'oil-temperature': thermocouple('OIL T', 'oil'),
  'coolant-temperature': thermocouple('COOLANT T', 'coolant'),
  'intake-air-temperature': thermocouple('INTAKE AIR', 'intake'),
  'outside-air-temperature': thermocouple('OAT', 'outside'),
  'oil-pressure': sender('voltage-transmitter', 'OIL P'),
  'fuel-pressure': sender('voltage-transmitter', 'FUEL P'),
  'fuel-flow': sender('pulse', 'FUEL FLOW'),
  'manifold-pressure': sender('voltage-transmitter', 'MAP'),
  'engine-speed': ({ ignition }) => ENGINE_SPEED_TAGS[ignition].flatMap((tag) => sender('pulse', tag)()),
  'bus-voltage': sender('direct', 'BUS V'),
  'alternator-current': sender('direct', 'ALT A'),
  'other-temperature': thermocouple('TEMP 1', 'engine-bay'),
}

/** The channels that measure what the layout asks for, in the order of a panel, on inputs 1, 2, 3 … */
export function layOutChannels(layout: EngineLayout): LaidOutChannel[] {
  const asked = QUANTITIES.filter((quantity) => layout.quantities.includes(quantity))
  return asked
    .flatMap((quantity) => PLANS[quantity](layout).map((planned) => ({ ...planned, quantity })))
    .map((planned, index) => ({
      ...planned,
      thermocoupleType: planned.sensor === 'thermocouple' ? PLANNED_TYPE : null,
      inputNumber: index + 1,
    }))
}
