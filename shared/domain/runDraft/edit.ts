import type { LoggedSection, WiringRunInput } from '../../schemas/run'
import { MAX_SECTIONS } from '../../schemas/run'
import type { RunJoint } from '../../thermometry/run'

/** Edits of a run being drawn up. Each returns a new run and leaves the given one as it was. */

/** True while the run can take another section. */
export function canAddJoint(run: WiringRunInput): boolean {
  return run.sections.length < MAX_SECTIONS
}

/**
 * Cuts a section in two and joins the halves in a zone. Both halves keep the conductors; the length stays with the
 * first, since only the builder knows where the cut is.
 */
export function addJoint(
  run: WiringRunInput,
  sectionId: string,
  zone: string,
  newId: () => string,
): WiringRunInput {
  const index = run.sections.findIndex(({ id }) => id === sectionId)
  const section = run.sections[index]
  if (!section || !canAddJoint(run)) return run
  const beyond: LoggedSection = {
    ...section,
    id: newId(),
    label: index === 0 ? 'Extension' : section.label,
    lengthMetres: null,
  }
  const joint: RunJoint = {
    id: newId(),
    label: 'Splice',
    kind: 'splice',
    tipSideZone: zone,
    displaySideZone: zone,
    crossed: false,
    positiveMetal: null,
    negativeMetal: null,
    positiveOffsetKelvin: 0,
    negativeOffsetKelvin: 0,
  }
  return {
    ...run,
    sections: run.sections.toSpliced(index + 1, 0, beyond),
    joints: run.joints.toSpliced(index, 0, joint),
  }
}

/** Takes a joint out: the section before it runs on to where the one behind it ended, with its own conductors. */
export function removeJoint(run: WiringRunInput, jointId: string): WiringRunInput {
  const index = run.joints.findIndex(({ id }) => id === jointId)
  const before = run.sections[index]
  const behind = run.sections[index + 1]
  if (!before || !behind) return run
  const known = before.lengthMetres !== null && behind.lengthMetres !== null
  const lengthMetres = known ? (before.lengthMetres ?? 0) + (behind.lengthMetres ?? 0) : before.lengthMetres
  return {
    ...run,
    sections: run.sections.toSpliced(index, 2, { ...before, lengthMetres }),
    joints: run.joints.toSpliced(index, 1),
  }
}

/** Changes what a section is. */
export function changeSection(
  run: WiringRunInput,
  sectionId: string,
  change: Partial<Omit<LoggedSection, 'id'>>,
): WiringRunInput {
  const sections = run.sections.map((section) =>
    section.id === sectionId ? { ...section, ...change } : section,
  )
  return { ...run, sections }
}

/** Changes what a joint is. A joint that is given a second zone needs contact metals: copper unless stated. */
export function changeJoint(
  run: WiringRunInput,
  jointId: string,
  change: Partial<Omit<RunJoint, 'id'>>,
): WiringRunInput {
  const joints = run.joints.map((joint) => {
    if (joint.id !== jointId) return joint
    const changed = { ...joint, ...change }
    if (changed.tipSideZone === changed.displaySideZone) return changed
    return {
      ...changed,
      positiveMetal: changed.positiveMetal ?? 'Cu',
      negativeMetal: changed.negativeMetal ?? 'Cu',
    }
  })
  return { ...run, joints }
}

/** Changes how the last section sits under the display's terminals. */
export function changeTerminals(
  run: WiringRunInput,
  change: Partial<WiringRunInput['terminals']>,
): WiringRunInput {
  return { ...run, terminals: { ...run.terminals, ...change } }
}

/** Crosses the legs at a joint, or uncrosses them; without a joint, at the terminals. */
export function crossLegs(run: WiringRunInput, jointId: string | null): WiringRunInput {
  if (jointId === null) return changeTerminals(run, { crossed: !run.terminals.crossed })
  const joint = run.joints.find(({ id }) => id === jointId)
  return joint ? changeJoint(run, jointId, { crossed: !joint.crossed }) : run
}

/** Turns a section's pair round at both its ends: the mistake that bench checks seldom find. The tip has no end. */
export function crossBothEnds(run: WiringRunInput, sectionId: string): WiringRunInput {
  const index = run.sections.findIndex(({ id }) => id === sectionId)
  const before = run.joints[index - 1]
  if (!before) return run
  return crossLegs(crossLegs(run, before.id), run.joints[index]?.id ?? null)
}
