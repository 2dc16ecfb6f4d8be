import type { Finding } from '../../thermometry/run'
import type { Thermoelement } from '../../thermometry/thermoelements'
import { THERMOELEMENTS } from '../../thermometry/thermoelements'
import type { FigureWords } from './figures'
import type { RunNames } from './names'
import { conductorWords, legWords } from './names'
import type { FindingWords } from './types'

type Of<Code extends Finding['code']> = Extract<Finding, { code: Code }>

function isThermoelement(name: string): name is Thermoelement {
  return (THERMOELEMENTS as readonly string[]).includes(name)
}

/** A conductor hotter or colder than its data reach. */
export function outsideRangeWords(
  { place, leg, conductor, celsius, lowCelsius, highCelsius }: Of<'outside-conductor-range'>,
  names: RunNames,
  figures: FigureWords,
): FindingWords {
  const what = isThermoelement(conductor) ? conductorWords(conductor) : `type ${conductor}`
  const where = leg === null ? names.place(place) : `${names.place(place)}, ${legWords(leg)}`
  return {
    title: `No figures for ${what} at ${figures.temperature(celsius)}`,
    explanation: `At ${where} the data of ${what} hold from ${figures.temperature(lowCelsius)} to ${figures.temperature(highCelsius)}. Beyond them no reading is stated rather than a guessed one.`,
    whatToDo:
      'Check the temperature of the zone first. If it is right, this conductor should not be there: keep it where its data hold.',
    cautions: [],
    severity: 'fault',
  }
}

/** A tip beyond the range of the planned type. */
export function tipOutsideRangeWords(
  { type, celsius, lowCelsius, highCelsius }: Of<'tip-outside-type-range'>,
  figures: FigureWords,
): FindingWords {
  return {
    title: `Tip at ${figures.temperature(celsius)} is beyond type ${type}`,
    explanation: `Type ${type} is defined from ${figures.temperature(lowCelsius)} to ${figures.temperature(highCelsius)}.`,
    whatToDo: 'Check the temperature of the tip zone, or plan a probe of a type that reaches it.',
    cautions: [],
    severity: 'fault',
  }
}

/** A display driven to its stop. */
export function offScaleWords(
  { direction, millivolts, limitCelsius }: Of<'off-scale'>,
  figures: FigureWords,
): FindingWords {
  const low = direction === 'low'
  return {
    title: `Display off scale, ${direction}`,
    explanation: `The display has ${figures.millivolts(millivolts)} to convert, ${low ? 'below' : 'above'} what belongs to its limit of ${figures.temperature(limitCelsius)}. It will show its limit, dashes or a fault mark.`,
    whatToDo: low
      ? 'A pair swapped at the terminals or at one plug does this as soon as the tip is warm: look there first.'
      : 'Look at the type setting and at the range of the display first. An open circuit drives many displays to the same stop.',
    cautions: ['With the display off scale this channel guards nothing: do not run the engine by it.'],
    severity: 'fault',
  }
}
