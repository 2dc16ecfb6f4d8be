import type { LetterType } from '../../thermometry/its90'
import { emfMillivolts } from '../../thermometry/its90'
import type { TemperatureUnit } from '../../units'
import { toCelsius } from '../../units'

export interface TableQuestion {
  type: LetterType
  unit: TemperatureUnit
  /** First and last temperature, in `unit`. */
  from: number
  to: number
  /** Distance of neighbouring entries, in `unit`; a whole number of them makes a row of ten. */
  step: number
  /** Temperature of the cold junction, in `unit`. */
  coldJunction: number
}

export interface TableRow {
  /** Temperature of the first entry, in the table's unit. */
  start: number
  /** emf at the terminals, mV; null before the first and after the last temperature of the table. */
  millivolts: (number | null)[]
}

/** Entries side by side, as the published tables print them. */
export const TABLE_COLUMNS = 10

/** More would be a book: 3,000 entries fill ten printed pages. */
export const MAX_TABLE_ENTRIES = 3000

/** Why a table cannot be made, for the person. */
export type TableRefusal = { field: 'from' | 'to' | 'step'; reason: string }

/**
 * What stands in the way of a table, if anything.
 *
 * @returns null when the table can be made
 */
export function refuseTable({ from, to, step }: TableQuestion): TableRefusal | null {
  if (!(step > 0)) return { field: 'step', reason: 'The step must be above zero.' }
  if (!(to > from)) return { field: 'to', reason: 'The table must end above where it begins.' }
  if ((to - from) / step > MAX_TABLE_ENTRIES)
    return {
      field: 'step',
      reason: `That makes more than ${MAX_TABLE_ENTRIES} entries. Widen the step or narrow the range.`,
    }
  return null
}

/**
 * A reference table of emf at the terminals, ten entries a row, rows beginning at whole multiples of ten steps.
 *
 * @throws OutOfRangeError when an end of the table or the cold junction lies outside the range of the type
 * @see NIST Monograph 175
 */
export function referenceTable(question: TableQuestion): TableRow[] {
  const { type, unit, from, to, step, coldJunction } = question
  const cold = emfMillivolts(type, toCelsius(coldJunction, unit))
  const rowSpan = step * TABLE_COLUMNS
  const first = Math.floor(from / rowSpan)
  const last = Math.floor(to / rowSpan)
  // Half a millionth of a step keeps the last entry in spite of binary fractions.
  const slack = step * 5e-7
  return Array.from({ length: last - first + 1 }, (_, row) => {
    const start = (first + row) * rowSpan
    const millivolts = Array.from({ length: TABLE_COLUMNS }, (_, column) => {
      const value = start + column * step
      if (value < from - slack || value > to + slack) return null
      return emfMillivolts(type, toCelsius(Math.min(Math.max(value, from), to), unit)) - cold
    })
    return { start, millivolts }
  })
}
