import type { Preferences } from '../../schemas/account'

/** The units the words are written in. */
export type ShownUnits = Pick<Preferences, 'temperatureUnit' | 'lengthUnit'>

/** A fault spoils the reading, a caution may, a note does not. */
export type FindingSeverity = 'fault' | 'caution' | 'note'

/** A finding as it is told to the person. */
export interface FindingWords {
  title: string
  explanation: string
  whatToDo: string
  /** Hazards and false comforts of what is to be done; may be empty. */
  cautions: readonly string[]
  severity: FindingSeverity
}
