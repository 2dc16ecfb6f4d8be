import type { Thermoelement } from '../thermoelements'
import { legsOf } from '../thermoelements'
import type { Circuit, CircuitElement, LegConductors } from './circuit'
import { exchangeLegs } from './circuit'
import { RunInputError } from './errors'
import { isReversed } from './orientation'
import type { LegValues, Place, RunConditions, RunJoint, ThermocoupleRun } from './types'

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

/**
 * Resolves crossings, zones and the reference point of a run: the circuit as the current sees it.
 *
 * @throws RunInputError when joints do not fit sections or a zone has no temperature
 */
export function resolveCircuit(run: ThermocoupleRun, conditions: RunConditions): Circuit {
  checkRun(run)
  const tipCelsius = zoneCelsius(conditions, run.tipZone, 'tipZone')
  const terminalCelsius = zoneCelsius(conditions, run.terminals.zone, 'terminals.zone')
  const terminalContacts = withOffsets(terminalCelsius, run.terminals)
  const odd = crossingsToDisplay(run)
  const needsBlock = run.display.compensation.kind === 'remote-block'
  const block = needsBlock ? run.joints.findIndex((joint) => joint.kind === 'reference-block') : -1
  const legs: LegConductors = legsOf(run.type)
  const intendedAt = (sectionIndex: number): LegConductors =>
    block >= 0 && sectionIndex > block ? COPPER : legs

  const oddAt = (index: number): boolean => odd[index] ?? false
  const resolved = run.sections.map((section, i): LegConductors => {
    const pair = { positive: section.positive, negative: section.negative }
    return oddAt(i) ? exchangeLegs(pair) : pair
  })
  const temperatures = run.joints.map((joint, i) => jointTemperatures(joint, i, conditions, oddAt(i + 1)))
  const tip: LegValues = { positive: tipCelsius, negative: tipCelsius }

  const elements: CircuitElement[] = []
  run.sections.forEach((section, i) => {
    const conductors = resolved[i] as LegConductors
    const intended = intendedAt(i)
    elements.push({
      place: { kind: 'section', sectionId: section.id },
      kind: 'section',
      displayEnd: { place: boundaryAfter(run, i), side: 'tip-side' },
      conductors,
      intended,
      reversed: isReversed(conductors, intended, oddAt(i)),
      tipSideCelsius: temperatures[i - 1]?.displaySide ?? tip,
      displaySideCelsius: temperatures[i]?.tipSide ?? terminalContacts,
    })
    const joint = run.joints[i]
    const contacts = temperatures[i]
    if (!joint || !contacts || !hasLength(joint)) return
    elements.push({
      place: { kind: 'joint', jointId: joint.id },
      kind: 'joint',
      displayEnd: { place: { kind: 'joint', jointId: joint.id }, side: 'display-side' },
      conductors: jointConductors(joint, resolved[i + 1] as LegConductors, oddAt(i + 1)),
      intended: intendedAt(i === block ? i + 1 : i),
      reversed: false,
      tipSideCelsius: contacts.tipSide,
      displaySideCelsius: contacts.displaySide,
    })
  })

  const blockJoint = run.joints[block]
  const referenceCelsius = blockJoint
    ? zoneCelsius(conditions, blockJoint.tipSideZone, `joints.${block}.tipSideZone`)
    : terminalCelsius
  if (run.terminals.positiveOffsetKelvin !== 0 || run.terminals.negativeOffsetKelvin !== 0)
    elements.push(displayCopper(terminalContacts, terminalCelsius, intendedAt(run.sections.length)))
  return {
    type: run.type,
    tipCelsius,
    referenceCelsius,
    referenceFound: !needsBlock || !!blockJoint,
    elements,
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
