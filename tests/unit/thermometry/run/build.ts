import type { LetterType, Thermoelement } from '#shared/thermometry'
import { legsOf } from '#shared/thermometry'
import type { DisplayInput, RunJoint, RunSection, ThermocoupleRun } from '#shared/thermometry/run'

/** Conductors of a section: a letter type, its reverse (`-K`), or two conductors by name. */
export type Pair = LetterType | `-${LetterType}` | readonly [Thermoelement, Thermoelement]

export function section(id: string, pair: Pair): RunSection {
  if (typeof pair !== 'string') return { id, label: id, positive: pair[0], negative: pair[1] }
  const reversed = pair.startsWith('-')
  const { positive, negative } = legsOf(pair.replace('-', '') as LetterType)
  return reversed
    ? { id, label: id, positive: negative, negative: positive }
    : { id, label: id, positive, negative }
}

export function joint(id: string, zone: string, changes: Partial<RunJoint> = {}): RunJoint {
  return {
    id,
    label: id,
    kind: 'plug-pair',
    tipSideZone: zone,
    displaySideZone: zone,
    crossed: false,
    positiveMetal: null,
    negativeMetal: null,
    positiveOffsetKelvin: 0,
    negativeOffsetKelvin: 0,
    ...changes,
  }
}

export function display(typeSetting: LetterType, changes: Partial<DisplayInput> = {}): DisplayInput {
  return {
    typeSetting,
    compensation: { kind: 'internal', sensorOffsetKelvin: 0 },
    gainErrorFraction: 0,
    offsetKelvin: 0,
    lowCelsius: null,
    highCelsius: null,
    ...changes,
  }
}

export function run(
  type: LetterType,
  sections: readonly RunSection[],
  joints: readonly RunJoint[],
  changes: Partial<ThermocoupleRun> = {},
): ThermocoupleRun {
  return {
    type,
    tipZone: 'tip',
    sections,
    joints,
    terminals: { zone: 'terminals', crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
    display: display(type),
    ...changes,
  }
}

/** Probe, plug pair, extension, terminals. */
export function twoSections(type: LetterType, extension: Pair, changes: Partial<ThermocoupleRun> = {}) {
  return run(type, [section('probe', type), section('ext', extension)], [joint('plug', 'plug')], changes)
}
