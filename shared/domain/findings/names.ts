import type { LetterType } from '../../thermometry/its90'
import type { Compensation, JointKind, Leg, Place, ThermocoupleRun } from '../../thermometry/run'
import type { Thermoelement } from '../../thermometry/thermoelements'
import { thermoelementInfo } from '../../thermometry/thermoelements'

const JOINT_KIND_WORDS: Record<JointKind, string> = {
  'plug-pair': 'plug pair',
  splice: 'splice',
  'terminal-block': 'terminal block',
  'feed-through': 'feed-through',
  'reference-block': 'reference block',
}

/** What a kind of joint is called in a sentence. */
export function jointKindWords(kind: JointKind): string {
  return JOINT_KIND_WORDS[kind]
}

/** A conductor in words: symbol and alloy for the legs of a letter type, the metal alone for the others. */
export function conductorWords(element: Thermoelement): string {
  const { symbol, name, letter } = thermoelementInfo(element)
  return letter ? `${symbol} (${name})` : name
}

/** `positive leg` or `negative leg`. */
export function legWords(leg: Leg): string {
  return `${leg} leg`
}

/** How a display accounts for its cold junction, in a few words. Temperatures in °C go through `temperature`. */
export function compensationWords(
  compensation: Compensation,
  temperature: (celsius: number) => string,
): string {
  switch (compensation.kind) {
    case 'internal':
      return 'Compensated at its terminals'
    case 'remote-block':
      return 'Compensated at the reference block'
    case 'fixed':
      return `Fixed compensation, ${temperature(compensation.celsius)}`
    case 'none':
      return 'No compensation'
    case 'adds-degrees':
      return 'Adds its terminals’ degrees'
    case 'zeroed':
      return `Zeroed at ${temperature(compensation.ambientCelsius)}`
  }
}

/** What the places of a run are called in sentences. */
export interface RunNames {
  type: LetterType
  place: (place: Place) => string
}

/** Names the places of a run by the labels its parts carry. */
export function runNames(run: Pick<ThermocoupleRun, 'type' | 'sections' | 'joints'>): RunNames {
  return { type: run.type, place: (place) => placeWords(run, place) }
}

function placeWords(run: Pick<ThermocoupleRun, 'sections' | 'joints'>, place: Place): string {
  switch (place.kind) {
    case 'tip':
      return 'the tip'
    case 'terminals':
      return 'the display terminals'
    case 'display':
      return 'the display'
    case 'section': {
      const index = run.sections.findIndex(({ id }) => id === place.sectionId)
      const label = run.sections[index]?.label
      return label === undefined ? 'a section' : `section ${index + 1}, “${label}”`
    }
    case 'joint': {
      const joint = run.joints.find(({ id }) => id === place.jointId)
      if (!joint) return 'a joint'
      const kind = JOINT_KIND_WORDS[joint.kind]
      return joint.label.toLowerCase() === kind ? `the ${kind}` : `the ${kind} “${joint.label}”`
    }
  }
}
