import type { LetterType } from '../its90'
import type { Thermoelement } from '../thermoelements'

/** What connects two sections of a run. */
export const JOINT_KINDS = [
  'plug-pair',
  'splice',
  'terminal-block',
  'feed-through',
  'reference-block',
] as const
export type JointKind = (typeof JOINT_KINDS)[number]

export type Leg = 'positive' | 'negative'
export const LEGS = ['positive', 'negative'] as const

/** A length of paired conductors, tip side to display side. The first section of a run is the probe itself. */
export interface RunSection {
  id: string
  label: string
  /** The conductor joined to the positive contact at its display end, as the section's own marking has it. */
  positive: Thermoelement
  negative: Thermoelement
}

/** What connects a section to the next one towards the display. */
export interface RunJoint {
  id: string
  label: string
  kind: JointKind
  /** Key into `RunConditions.zoneCelsius`: where the contacts to the tip-side section sit. */
  tipSideZone: string
  /** Where the contacts to the display-side section sit; the same zone unless the joint has length. */
  displaySideZone: string
  /**
   * True when the positive conductor of the tip side meets the negative contact. The crossing lies on the tip
   * side: contact metals and offsets are named by the leg of the display side.
   */
  crossed: boolean
  /** Metal of a contact that has length (pin and socket, stud); null when the conductors meet directly. */
  positiveMetal: Thermoelement | null
  negativeMetal: Thermoelement | null
  /** How much warmer than its zone the contact of each leg is, kelvin. */
  positiveOffsetKelvin: number
  negativeOffsetKelvin: number
}

/** The display's terminals: the end of the run, in a zone of their own. */
export interface RunTerminals {
  zone: string
  /** True when the last section's positive conductor sits under the negative terminal. */
  crossed: boolean
  positiveOffsetKelvin: number
  negativeOffsetKelvin: number
}

export const COMPENSATION_KINDS = [
  'internal',
  'remote-block',
  'fixed',
  'none',
  'adds-degrees',
  'zeroed',
] as const
export type CompensationKind = (typeof COMPENSATION_KINDS)[number]

/**
 * How the display accounts for its cold junction.
 * - `internal`: a sensor at the terminals that reads `sensorOffsetKelvin` above their true temperature
 * - `remote-block`: the sensor sits in the run's reference block; copper beyond the block is as intended
 * - `fixed`: the display assumes the terminals to be at `celsius`
 * - `none`: the display assumes 0 °C
 * - `adds-degrees`: converts the bare emf and adds the terminals' degrees instead of their millivolts
 * - `zeroed`: a gauge whose pointer was set to `ambientCelsius` with the circuit open
 */
export type Compensation =
  | { kind: 'internal'; sensorOffsetKelvin: number }
  | { kind: 'remote-block'; sensorOffsetKelvin: number }
  | { kind: 'fixed'; celsius: number }
  | { kind: 'none' }
  | { kind: 'adds-degrees'; sensorOffsetKelvin: number }
  | { kind: 'zeroed'; ambientCelsius: number }

/** The display input the run ends at. */
export interface DisplayInput {
  /** The type the input is set to, right or wrong. */
  typeSetting: LetterType
  compensation: Compensation
  /** Gain error as a fraction of the indicated reading in °C: 0.01 shows 1 % too much. */
  gainErrorFraction: number
  offsetKelvin: number
  /** What the display can show, °C; null when only the type's own range limits it. */
  lowCelsius: number | null
  highCelsius: number | null
}

/** A thermocouple circuit from probe tip to display terminals, as built. */
export interface ThermocoupleRun {
  /** The type the channel is planned to be: what every conductor and the display should match. */
  type: LetterType
  tipZone: string
  /** Tip to display; at least one. */
  sections: readonly RunSection[]
  /** joints[i] connects sections[i] to sections[i + 1]; one fewer than sections. */
  joints: readonly RunJoint[]
  terminals: RunTerminals
  display: DisplayInput
}

/** Zone temperatures in one operating state, °C by zone key. */
export interface RunConditions {
  zoneCelsius: Readonly<Record<string, number>>
}

/** Somewhere along a run. */
export type Place =
  | { kind: 'tip' }
  | { kind: 'section'; sectionId: string }
  | { kind: 'joint'; jointId: string }
  | { kind: 'terminals' }
  | { kind: 'display' }

export interface LegValues {
  positive: number
  negative: number
}

/** What one stretch of conductor pair (a section, a joint with length, the display's own copper) adds. */
export interface Contribution {
  place: Place
  /** Conductors after crossings are resolved: by the display terminal they lead to. */
  conductors: { positive: Thermoelement; negative: Thermoelement }
  intended: { positive: Thermoelement; negative: Thermoelement }
  /** True where the section's own marking lies in the other leg, by crossings between it and the display. */
  reversed: boolean
  tipSideCelsius: LegValues
  displaySideCelsius: LegValues
  /** emf of each leg, walking + terminal → tip → − terminal, mV; null where no single-leg data reach. */
  legMillivolts: { positive: number | null; negative: number | null }
  /** emf of the pair, mV; null when withheld. */
  millivolts: number | null
  /** What the intended conductors would add between the same temperatures, mV. */
  intendedMillivolts: number | null
}

/** One contact between two conductors of a leg, and its share in the emf error. */
export interface ContactShare {
  place: Place
  side: 'tip-side' | 'display-side'
  leg: Leg
  celsius: number
  /** Tip-side metal first. */
  metals: readonly [Thermoelement, Thermoelement]
  microvolts: number
}

export type Indication =
  | { kind: 'value'; celsius: number }
  | { kind: 'off-scale-low'; limitCelsius: number }
  | { kind: 'off-scale-high'; limitCelsius: number }
  | { kind: 'withheld' }

export const CAUSE_KINDS = [
  'legs-swapped',
  'conductors',
  'contact-metal',
  'terminal-contacts',
  'display-type',
  'compensation',
  'display-error',
] as const
export type CauseKind = (typeof CAUSE_KINDS)[number]

/**
 * One cause of the error. `kelvin` is by how much putting it right, after every cause nearer the tip,
 * changes the indicated reading; null when a step of that order is off scale.
 */
export interface Cause {
  kind: CauseKind
  place: Place
  /** emf error at the terminals put right with it, µV; null for causes inside the display. */
  microvolts: number | null
  kelvin: number | null
}

export type Finding =
  | {
      code: 'stray-junction'
      place: Place
      leg: Leg
      metals: readonly [Thermoelement, Thermoelement]
      celsius: number
      microvolts: number
      /** Change of the reading if this share alone were taken away; null off scale. */
      kelvin: number | null
    }
  | {
      code: 'legs-swapped'
      sectionIds: readonly string[]
      places: readonly Place[]
      microvolts: number | null
    }
  | { code: 'wrong-conductor'; place: Place; leg: Leg; actual: Thermoelement; intended: Thermoelement }
  | { code: 'harmless-metal'; place: Place; leg: Leg; metal: Thermoelement }
  | { code: 'unequal-contacts'; place: Place; differenceKelvin: number }
  | { code: 'display-type-mismatch'; setting: LetterType; type: LetterType }
  | { code: 'compensation-missing'; referenceCelsius: number }
  | { code: 'compensation-error'; compensationCelsius: number; referenceCelsius: number }
  | { code: 'compensation-adds-degrees'; referenceCelsius: number }
  | { code: 'display-error'; gainErrorFraction: number; offsetKelvin: number }
  | { code: 'reference-block-missing' }
  | {
      code: 'outside-conductor-range'
      place: Place
      leg: Leg | null
      /** The conductor, or the letter type of a matched pair. */
      conductor: Thermoelement | LetterType
      celsius: number
      lowCelsius: number
      highCelsius: number
    }
  | {
      code: 'tip-outside-type-range'
      type: LetterType
      celsius: number
      lowCelsius: number
      highCelsius: number
    }
  | {
      code: 'off-scale'
      direction: 'low' | 'high'
      /** The emf the display converts: terminals plus compensation, mV. */
      millivolts: number
      limitCelsius: number
    }

export type FindingCode = Finding['code']

/** The run solver's answer for one set of conditions. */
export interface RunSolution {
  tipCelsius: number
  /** True temperature of the reference point (terminals, or the reference block), °C. */
  referenceCelsius: number
  /** The temperature the display compensates for, °C. */
  compensationCelsius: number
  /** emf the display adds for its compensation, mV (0 for a display that adds degrees). */
  compensationMillivolts: number | null
  terminalMillivolts: number | null
  /** emf a run of the intended conductors would deliver between tip and reference point, mV. */
  intendedMillivolts: number | null
  /** terminalMillivolts − intendedMillivolts, µV. */
  emfErrorMicrovolts: number | null
  indication: Indication
  /** Indicated − tip, kelvin; null off scale or withheld. */
  errorKelvin: number | null
  /** Tip to display. */
  contributions: readonly Contribution[]
  /** Tip to display; the microvolts add up to emfErrorMicrovolts. Empty when withheld. */
  contactShares: readonly ContactShare[]
  /** Tip to display; the kelvins add up to errorKelvin when none is null. */
  causes: readonly Cause[]
  findings: readonly Finding[]
}

export interface OperatingConditions extends RunConditions {
  id: string
  name: string
}

/** The solver's answers over operating states and the worst of them. */
export interface RunStatesSolution {
  states: readonly { id: string; name: string; solution: RunSolution }[]
  /** Off scale counts as worse than any finite error, a withheld answer as worst. Null without states. */
  worst: { id: string; name: string; indication: Indication; errorKelvin: number | null } | null
}
