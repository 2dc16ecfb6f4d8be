import type { Finding } from '../../thermometry/run'
import { CAUTIONS } from './cautions'
import type { FigureWords } from './figures'
import type { FindingWords } from './types'

type Of<Code extends Finding['code']> = Extract<Finding, { code: Code }>

/** Within this a cold-junction sensor is as good as they come, kelvin. */
const USUAL_SENSOR_KELVIN = 1

/** Display set to another type than the channel's. */
export function typeMismatchWords({ setting, type }: Of<'display-type-mismatch'>): FindingWords {
  return {
    title: `Display set to type ${setting}, channel wired as type ${type}`,
    explanation: `The display turns millivolts into degrees, and its terminals’ degrees into millivolts, by the type ${setting} table. The type ${type} pair does not follow that table.`,
    whatToDo: `Set this input to type ${type} and look at the reading again with the tip hot.`,
    cautions: [CAUTIONS.cold],
    severity: 'fault',
  }
}

/** Display that adds nothing for its cold junction. */
export function compensationMissingWords(
  { referenceCelsius }: Of<'compensation-missing'>,
  figures: FigureWords,
): FindingWords {
  return {
    title: 'No cold-junction compensation',
    explanation: `The display takes its cold junction to be at ${figures.temperature(0)}; it is at ${figures.temperature(referenceCelsius)}. What lies between is missing from the reading.`,
    whatToDo:
      'Switch compensation on for this input, or use a display that has it. Where the maker means it to be off, bring the run to a reference block of known temperature.',
    cautions: [],
    severity: 'fault',
  }
}

/** Display that compensates for a temperature its cold junction does not have. */
export function compensationErrorWords(
  { compensationCelsius, referenceCelsius }: Of<'compensation-error'>,
  figures: FigureWords,
): FindingWords {
  const kelvin = compensationCelsius - referenceCelsius
  const way = kelvin > 0 ? 'high' : 'low'
  return {
    title: `Cold-junction compensation ${figures.degrees(kelvin)} too ${way}`,
    explanation: `The display compensates for ${figures.temperature(compensationCelsius)} while its cold junction is at ${figures.temperature(referenceCelsius)}. The reading is too ${way} by about as much.`,
    whatToDo:
      'Measure the terminals with a thermometer beside them. Where the display lets you, correct its sensor; otherwise take away what warms the sensor or the terminals. All inputs of this display are touched alike.',
    cautions: [],
    severity: Math.abs(kelvin) < USUAL_SENSOR_KELVIN ? 'caution' : 'fault',
  }
}

/** Display that adds degrees where it should add millivolts. */
export function addsDegreesWords(
  { referenceCelsius }: Of<'compensation-adds-degrees'>,
  figures: FigureWords,
): FindingWords {
  return {
    title: 'Display adds degrees instead of millivolts',
    explanation: `It converts the bare emf and then adds the ${figures.temperature(referenceCelsius)} of its terminals. A thermocouple is not a straight line, so the sum is off wherever its slope at the tip differs from that at the terminals.`,
    whatToDo: 'Expect this error from this kind of display, and write it beside the limits you set.',
    cautions: [],
    severity: 'caution',
  }
}

/** Gain and offset of the display itself. */
export function displayErrorWords(
  { gainErrorFraction, offsetKelvin }: Of<'display-error'>,
  figures: FigureWords,
): FindingWords {
  const parts = [
    ...(gainErrorFraction === 0 ? [] : [`${figures.percent(gainErrorFraction)} of the reading`]),
    ...(offsetKelvin === 0 ? [] : [`${figures.difference(offsetKelvin)} everywhere`]),
  ]
  return {
    title: 'Display has an error of its own',
    explanation: `As recorded, it shows ${parts.join(' and ')} beyond what its terminals tell it.`,
    whatToDo:
      'Feed known millivolts into the terminals with a simulator, at a low and at a high reading, and adjust the display or keep the error on record.',
    cautions: ['Disconnect the probe first, with the engine stopped and the ignition off.'],
    severity: 'caution',
  }
}

/** Display that relies on a reference block the run does not have. */
export function blockMissingWords(): FindingWords {
  return {
    title: 'No reference block in this run',
    explanation:
      'The display compensates for a sensor in a remote reference block, and no joint of the run is one. Without it the reading cannot be worked out.',
    whatToDo:
      'Log the joint that is the reference block, or record the display as compensating at its own terminals.',
    cautions: [],
    severity: 'fault',
  }
}
