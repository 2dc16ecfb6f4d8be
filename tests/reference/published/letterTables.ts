import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { LetterType } from '#shared/thermometry/its90'
import { LETTER_TYPES } from '#shared/thermometry/its90'

/** mV by whole °C. */
export type LetterTable = ReadonlyMap<number, number>

const TITLE = /Table for type ([BEJKNRST]) thermocouple/
const COLUMNS_GO_DOWN = /\s0\s+-1\s+-2\s/
const COLUMNS_GO_UP = /\s0\s+1\s+2\s/
/** A temperature and the values of its ten degrees, printed to 1 µV; coefficients have exponents and do not match. */
const ROW = /^\s*(-?\d+)((?:\s+-?\d+\.\d{3})+)\s*$/

function enter(table: Map<number, number>, celsius: number, millivolts: number): void {
  const before = table.get(celsius)
  // The last column of a row is printed again as the first of the next.
  if (before !== undefined && before !== millivolts)
    throw new Error(`The table gives ${before} and ${millivolts} mV at ${celsius} °C.`)
  table.set(celsius, millivolts)
}

/** Reads the printed tables of the letter types. */
export function parseLetterTables(text: string): Record<LetterType, LetterTable> {
  const tables = Object.fromEntries(LETTER_TYPES.map((type) => [type, new Map<number, number>()])) as Record<
    LetterType,
    Map<number, number>
  >
  let table: Map<number, number> | undefined
  let direction = 1
  for (const line of text.split(/\r?\n/)) {
    const title = TITLE.exec(line)
    if (title) table = tables[title[1] as LetterType]
    else if (COLUMNS_GO_DOWN.test(line)) direction = -1
    else if (COLUMNS_GO_UP.test(line)) direction = 1
    const row = ROW.exec(line)
    if (!row || !table) continue
    const values = (row[2] ?? '').trim().split(/\s+/)
    for (const [i, value] of values.entries()) enter(table, Number(row[1]) + direction * i, Number(value))
  }
  return tables
}

const require = createRequire(import.meta.url)
const FILE = require.resolve('thermocouple-converter/reference/all.tab')

/**
 * The printed 1 °C tables, reference junction at 0 °C. The file is not UTF-8: its degree sign is a single byte.
 * Source: NIST Standard Reference Database 60 (Monograph 175), as the package thermocouple-converter 1.0.1 ships it.
 */
export const LETTER_TABLES = parseLetterTables(readFileSync(FILE, 'latin1'))
