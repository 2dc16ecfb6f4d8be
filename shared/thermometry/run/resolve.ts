import type { Thermoelement } from '../thermoelements'
import { legsOf } from '../thermoelements'
import type { Circuit, CircuitElement, LegConductors } from './circuit'
import { RunInputError } from './errors'
import { isReversed } from './orientation'
import type { LegValues, Place, RunConditions, RunJoint, RunSection, ThermocoupleRun } from './types'

const COPPER: LegConductors = { positive: 'Cu', negative: 'Cu' }

function zoneCelsius(conditions: RunConditions, zone: string, field: string): number {
  const celsius = Object.hasOwn(conditions.zoneCelsius, zone) ? conditions.zoneCelsius[zone] : undefined
  if (celsius === undefined || !Number.isFinite(celsius))
    throw new RunInputError(field, `No temperature is given for the zone "${zone}".`)
  return celsius
}

function withOffsets(
  celsius: number,
  part: { positiveOffsetKelvin: number; negativeOffsetKelvin: number },
): LegValues {
  return { positive: celsius + part.positiveOffsetKelvin, negative: celsius + part.negativeOffsetKelvin }
}

/** For each section: whether an odd number of crossings lies between it and the display. */
function crossingsToDisplay(run: ThermocoupleRun): boolean[] {
  const odd: boolean[] = []
  let crossed = run.terminals.crossed
  for (let i = run.sections.length - 1; i >= 0; i--) {
    odd[i] = crossed
    if (run.joints[i - 1]?.crossed) crossed = !crossed
  }
  return odd
}

/** The joint after a section, or the terminals after the last one. */
export function boundaryAfter(run: ThermocoupleRun, sectionIndex: number): Place {
  const joint = run.joints[sectionIndex]
  return joint ? { kind: 'joint', jointId: joint.id } : { kind: 'terminals' }
}

interface ResolvedJoint {
  tipSide: LegValues
  displaySide: LegValues
}

/** Contact temperatures by resolved leg. Contacts are named by the joint's display side. */
function jointTemperatures(
  joint: RunJoint,
  index: number,
  conditions: RunConditions,
  oddBeyond: boolean,
): ResolvedJoint {
  const sides = (['tipSideZone', 'displaySideZone'] as const).map((side) => {
    const contacts = withOffsets(zoneCelsius(conditions, joint[side], `joints.${index}.${side}`), joint)
    return oddBeyond ? { positive: contacts.negative, negative: contacts.positive } : contacts
  })
  const [tipSide, displaySide] = sides as [LegValues, LegValues]
  return { tipSide, displaySide }
}

function jointConductors(joint: RunJoint, beyond: LegConductors, oddBeyond: boolean): LegConductors {
  const metals = oddBeyond
    ? { positive: joint.negativeMetal, negative: joint.positiveMetal }
    : { positive: joint.positiveMetal, negative: joint.negativeMetal }
  return { positive: metals.positive ?? beyond.positive, negative: metals.negative ?? beyond.negative }
}

function hasLength(joint: RunJoint): boolean {
  return joint.positiveMetal !== null || joint.negativeMetal !== null
}

function checkRun(run: ThermocoupleRun): void {
  if (run.sections.length === 0) throw new RunInputError('sections', 'A run has at least one section.')
  if (run.joints.length !== run.sections.length - 1)
    throw new RunInputError(
      'joints',
      `A run of ${run.sections.length} sections has ${run.sections.length - 1} joints, not ${run.joints.length}.`,
    )
  run.joints.forEach((joint, index) => {
    const bothMetals = joint.positiveMetal !== null && joint.negativeMetal !== null
    if (joint.tipSideZone !== joint.displaySideZone && !bothMetals)
      throw new RunInputError(
        `joints.${index}.positiveMetal`,
        'A joint that spans two zones needs the metal of both its contacts.',
      )
  })
}

/** A run with what is worked out once for all of its elements. */
interface Preparation {
  run: ThermocoupleRun
  /** By section: whether an odd number of crossings lies between it and the display. */
  odd: readonly boolean[]
  /** By joint: temperatures of its contacts. */
  contacts: readonly ResolvedJoint[]
  tip: LegValues
  terminals: LegValues
  /** Index of the reference block the display relies on; −1 where the terminals are the reference point. */
  block: number
}

/** What the conductors of a section should be: the planned type, and copper beyond a reference block. */
function intendedAt({ run, block }: Preparation, sectionIndex: number): LegConductors {
  return block >= 0 && sectionIndex > block ? COPPER : legsOf(run.type)
}

function resolvedConductors({ run, odd }: Preparation, sectionIndex: number): LegConductors {
  const { positive, negative } = run.sections[sectionIndex] as RunSection
  return odd[sectionIndex] ? { positive: negative, negative: positive } : { positive, negative }
}

function sectionElement(prepared: Preparation, index: number): CircuitElement {
  const { run, odd, contacts, tip, terminals } = prepared
  const conductors = resolvedConductors(prepared, index)
  const intended = intendedAt(prepared, index)
  return {
    place: { kind: 'section', sectionId: (run.sections[index] as RunSection).id },
    kind: 'section',
    displayEnd: { place: boundaryAfter(run, index), side: 'tip-side' },
    conductors,
    intended,
    reversed: isReversed(conductors, intended, odd[index] ?? false),
    tipSideCelsius: contacts[index - 1]?.displaySide ?? tip,
    displaySideCelsius: contacts[index]?.tipSide ?? terminals,
  }
}

/** The contacts of a joint, where they have length; none where the conductors meet directly. */
function jointElement(prepared: Preparation, index: number): CircuitElement[] {
  const { run, odd, contacts, block } = prepared
  const joint = run.joints[index]
  const temperatures = contacts[index]
  if (!joint || !temperatures || !hasLength(joint)) return []
  const place: Place = { kind: 'joint', jointId: joint.id }
  return [
    {
      place,
      kind: 'joint',
      displayEnd: { place, side: 'display-side' },
      conductors: jointConductors(joint, resolvedConductors(prepared, index + 1), odd[index + 1] ?? false),
      intended: intendedAt(prepared, index === block ? index + 1 : index),
      reversed: false,
      tipSideCelsius: temperatures.tipSide,
      displaySideCelsius: temperatures.displaySide,
    },
  ]
}

/**
 * Resolves crossings, zones and the reference point of a run: the circuit as the current sees it.
 *
 * @throws RunInputError when joints do not fit sections or a zone has no temperature
 */
export function resolveCircuit(run: ThermocoupleRun, conditions: RunConditions): Circuit {
  checkRun(run)
  const tipCelsius = zoneCelsius(conditions, run.tipZone, 'tipZone')
  const terminalCelsius = zoneCelsius(conditions, run.terminals.zone, 'terminals.zone')
  const odd = crossingsToDisplay(run)
  const needsBlock = run.display.compensation.kind === 'remote-block'
  const block = needsBlock ? run.joints.findIndex((joint) => joint.kind === 'reference-block') : -1
  const blockJoint = run.joints[block]
  const prepared: Preparation = {
    run,
    odd,
    contacts: run.joints.map((joint, i) => jointTemperatures(joint, i, conditions, odd[i + 1] ?? false)),
    tip: { positive: tipCelsius, negative: tipCelsius },
    terminals: withOffsets(terminalCelsius, run.terminals),
    block,
  }
  const offLevel = run.terminals.positiveOffsetKelvin !== 0 || run.terminals.negativeOffsetKelvin !== 0
  const beyond = intendedAt(prepared, run.sections.length)
  return {
    type: run.type,
    tipCelsius,
    referenceCelsius: blockJoint
      ? zoneCelsius(conditions, blockJoint.tipSideZone, `joints.${block}.tipSideZone`)
      : terminalCelsius,
    referenceFound: !needsBlock || blockJoint !== undefined,
    elements: [
      ...run.sections.flatMap((_, i) => [sectionElement(prepared, i), ...jointElement(prepared, i)]),
      ...(offLevel ? [displayCopper(prepared.terminals, terminalCelsius, beyond)] : []),
    ],
  }
}

/** The display's own copper between terminals that are not at the temperature of the reference point. */
function displayCopper(contacts: LegValues, celsius: number, intended: LegConductors): CircuitElement {
  const copper: Thermoelement = 'Cu'
  return {
    place: { kind: 'terminals' },
    kind: 'internal',
    displayEnd: { place: { kind: 'display' }, side: 'tip-side' },
    conductors: { positive: copper, negative: copper },
    intended,
    reversed: false,
    tipSideCelsius: contacts,
    displaySideCelsius: { positive: celsius, negative: celsius },
  }
}
