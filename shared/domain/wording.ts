import type { Quantity } from '../schemas/aircraft'
import type { Sensor } from '../schemas/channel'
import type { CompensationKind, FindingCode, JointKind } from '../thermometry/run'
import type { ChannelStanding } from '../types/workbook'
import type { ZoneKind } from '../schemas/zone'

/** The trade's words for the values that records hold. */

export const QUANTITY_WORDS: Record<Quantity, string> = {
  'exhaust-gas-temperature': 'Exhaust gas temperature',
  'cylinder-head-temperature': 'Cylinder head temperature',
  'oil-temperature': 'Oil temperature',
  'coolant-temperature': 'Coolant temperature',
  'intake-air-temperature': 'Intake air temperature',
  'outside-air-temperature': 'Outside air temperature',
  'oil-pressure': 'Oil pressure',
  'fuel-pressure': 'Fuel pressure',
  'fuel-flow': 'Fuel flow',
  'manifold-pressure': 'Manifold pressure',
  'engine-speed': 'Engine speed',
  'bus-voltage': 'Bus voltage',
  'alternator-current': 'Alternator current',
  'other-temperature': 'Other temperature',
}

export const SENSOR_WORDS: Record<Sensor, string> = {
  thermocouple: 'Thermocouple',
  'platinum-rtd': 'Platinum resistance thermometer',
  thermistor: 'Thermistor',
  'resistive-sender': 'Resistive sender',
  'voltage-transmitter': 'Voltage transmitter',
  'current-transmitter': 'Current transmitter',
  pulse: 'Pulse pick-up',
  direct: 'Direct electrical measurement',
}

export const ZONE_KIND_WORDS: Record<ZoneKind, string> = {
  exhaust: 'Exhaust',
  'cylinder-head': 'Cylinder head',
  oil: 'Oil',
  coolant: 'Coolant',
  intake: 'Intake',
  'engine-bay': 'Engine bay',
  firewall: 'Firewall',
  cabin: 'Cabin',
  panel: 'Panel',
  terminals: 'Display terminals',
  outside: 'Outside air',
  other: 'Other',
}

export const JOINT_WORDS: Record<JointKind, string> = {
  'plug-pair': 'Plug pair',
  splice: 'Splice',
  'terminal-block': 'Terminal block',
  'feed-through': 'Feed-through',
  'reference-block': 'Reference block',
}

export const COMPENSATION_WORDS: Record<CompensationKind, string> = {
  internal: 'Sensor at its own terminals',
  'remote-block': 'Sensor in a reference block of the run',
  fixed: 'Fixed temperature',
  none: 'None',
  'adds-degrees': 'Adds the terminals’ degrees',
  zeroed: 'Pointer zeroed to ambient',
}

export const STANDING_WORDS: Record<ChannelStanding, string> = {
  planned: 'Planned',
  'no-display': 'No display input',
  'no-run': 'No run logged',
  faults: 'Fault found',
  'as-intended': 'As intended',
  'record-only': 'Record only',
}

/** What to do next with a channel of each standing. */
export const NEXT_STEP_WORDS: Record<ChannelStanding, string> = {
  planned: 'Log its probe and its wiring run.',
  'no-display': 'Give it a display input.',
  'no-run': 'Log its wiring run.',
  faults: 'Open it: the findings name the place and what to do.',
  'as-intended': 'Nothing is wrong as logged. Prove it by checks on the aircraft.',
  'record-only': 'Kept as a record; no expected reading is worked out for this sensor.',
}

/** Findings in a few words, for lists and tables. */
export const FINDING_WORDS: Record<FindingCode, string> = {
  'stray-junction': 'stray junction',
  'legs-swapped': 'legs swapped',
  'wrong-conductor': 'wrong conductor',
  'harmless-metal': 'other metal, harmless',
  'unequal-contacts': 'terminals off temperature',
  'display-type-mismatch': 'input set to another type',
  'compensation-missing': 'no compensation',
  'compensation-error': 'compensation off',
  'compensation-adds-degrees': 'adds degrees, not emf',
  'display-error': 'display error',
  'reference-block-missing': 'no reference block',
  'outside-conductor-range': 'beyond a conductor’s data',
  'tip-outside-type-range': 'tip beyond the type’s range',
  'off-scale': 'off scale',
}
