import type { Finding } from '../../thermometry/run'
import type { Thermoelement } from '../../thermometry/thermoelements'
import { pairType, sameThermoelement } from '../../thermometry/thermoelements'
import { CAUTIONS } from './cautions'
import type { FigureWords } from './figures'
import type { RunNames } from './names'
import { conductorWords, legWords } from './names'
import type { FindingWords } from './types'

type Of<Code extends Finding['code']> = Extract<Finding, { code: Code }>

/** Below this a stray junction is worth knowing and not worth grounding a channel for, kelvin. */
const SMALL_KELVIN = 1

/** `makes the reading 20.1 °C too low`. */
function effectOnReading(kelvin: number | null, figures: FigureWords): string {
  if (kelvin === null)
    return 'How many degrees that makes cannot be said, because the display shows no value.'
  const way = kelvin > 0 ? 'high' : 'low'
  return `That makes the reading ${figures.degrees(kelvin)} too ${way}.`
}

/** A contact of two metals that adds to the reading. */
export function strayJunctionWords(
  { place, leg, metals, celsius, microvolts, kelvin }: Of<'stray-junction'>,
  names: RunNames,
  figures: FigureWords,
): FindingWords {
  const [tipSide, displaySide] = metals
  const where = names.place(place)
  const legsOfOnePair = pairType(tipSide, displaySide) !== null
  const repair = legsOfOnePair
    ? 'The two metals are the two legs of one pair: look for swapped conductors here first.'
    : 'Fit contacts and cable of this leg’s own alloy, so that the same alloy runs on both sides.'
  return {
    title: `Stray junction at ${where}, ${legWords(leg)}`,
    explanation: `At ${figures.temperature(celsius)}, ${conductorWords(tipSide)} meets ${conductorWords(displaySide)}. This contact adds ${figures.microvolts(microvolts)} that do not come from the tip. ${effectOnReading(kelvin, figures)}`,
    whatToDo: `${repair} To find it on the aircraft, keep the tip steady and warm this joint alone: in a right run the reading does not move.`,
    cautions: [CAUTIONS.heat, CAUTIONS.cold],
    severity: kelvin !== null && Math.abs(kelvin) < SMALL_KELVIN ? 'caution' : 'fault',
  }
}

/** Names in a row: a, b and c. */
function inWords(items: readonly string[]): string {
  return items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`
}

function magnetHint(type: RunNames['type']): string {
  if (type === 'K') return ' A magnet draws KN and not KP.'
  if (type === 'J') return ' A magnet draws JP (iron) and not JN.'
  return ''
}

/** Sections whose conductors lie in each other's leg. */
export function legsSwappedWords(
  { sectionIds, places, microvolts }: Of<'legs-swapped'>,
  names: RunNames,
  figures: FigureWords,
): FindingWords {
  const where = inWords(places.map(names.place))
  const sections = inWords(sectionIds.map((sectionId) => names.place({ kind: 'section', sectionId })))
  const both = places.length > 1
  const cloak = both
    ? ' Swapped at both ends, the pair arrives at the terminals the right way round, so a warm tip still makes the reading rise. Each section between counts backwards, and the reading is wrong by about twice its temperature difference.'
    : ' From here to the tip the pair counts backwards.'
  const size = microvolts === null ? '' : ` It changes the emf by ${figures.microvolts(microvolts)}.`
  return {
    title: `Legs swapped at ${where}`,
    explanation: `In ${sections} the positive and the negative conductor lie in each other’s leg.${cloak}${size}`,
    whatToDo: `Exchange the two conductors at ${where}. Go by the alloy, not by the colour of the insulation.${magnetHint(names.type)} Warm the joint again afterwards: a right run does not move.`,
    cautions: [CAUTIONS.heat, CAUTIONS.cold],
    severity: 'fault',
  }
}

function capitalised(words: string): string {
  return `${words.charAt(0).toUpperCase()}${words.slice(1)}`
}

function copperHint(actual: Thermoelement): string {
  if (!sameThermoelement(actual, 'Cu')) return ''
  return ' Copper in both legs adds nothing: the reading then lacks about the difference between the temperatures of the two ends.'
}

/** A section laid in another alloy. */
export function wrongConductorWords(
  { place, leg, actual, intended }: Of<'wrong-conductor'>,
  names: RunNames,
): FindingWords {
  return {
    title: `${capitalised(conductorWords(actual))} instead of ${conductorWords(intended)}: ${names.place(place)}, ${legWords(leg)}`,
    explanation: `Another alloy than type ${names.type} asks for makes its own emf wherever its two ends differ in temperature, so the reading follows the warmth of the joints as well as the tip.${copperHint(actual)}`,
    whatToDo: `Replace the section by type ${names.type} cable, from joint to joint. Loop resistance tells copper from thermocouple alloy before the cable is opened.`,
    cautions: [CAUTIONS.resistance, CAUTIONS.cold],
    severity: 'fault',
  }
}

/** A foreign metal between equal temperatures. */
export function harmlessMetalWords(
  { place, leg, metal }: Of<'harmless-metal'>,
  names: RunNames,
): FindingWords {
  return {
    title: `Foreign metal without effect at ${names.place(place)}, ${legWords(leg)}`,
    explanation: `The contact is ${conductorWords(metal)}. Between equal temperatures another metal adds nothing, so the reading is not touched.`,
    whatToDo:
      'Nothing, as long as both ends of the contact stay at one temperature: keep it out of draughts and away from the exhaust.',
    cautions: [],
    severity: 'note',
  }
}

/** Terminals that are not at the temperature of the reference point. */
export function unequalContactsWords(
  { place, differenceKelvin }: Of<'unequal-contacts'>,
  names: RunNames,
  figures: FigureWords,
): FindingWords {
  const where = names.place(place)
  const difference =
    differenceKelvin === 0
      ? 'Both contacts stand away from the temperature the display compensates for, by the same amount.'
      : `The positive contact is ${figures.degrees(differenceKelvin)} ${differenceKelvin > 0 ? 'warmer' : 'colder'} than the negative one.`
  return {
    title:
      differenceKelvin === 0
        ? `Contacts off the reference point at ${where}`
        : `Contacts of unequal temperature at ${where}`,
    explanation: `${difference} What lies between them and the reference point is copper, which the display does not allow for.`,
    whatToDo:
      'Shield the contacts from draught, lamps and hot parts, and let both settle beside the display’s own sensor.',
    cautions: [],
    severity: 'caution',
  }
}
