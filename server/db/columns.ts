import { customType, datetime, int } from 'drizzle-orm/mysql-core'

/**
 * A decimal column read and written as a number.
 *
 * The driver hands decimals over as text so that nothing is lost. Every column here has at most 12 digits, and a
 * double carries 15, so the number is exact to the last digit stored.
 */
export const decimalNumber = customType<{
  data: number
  driverData: string
  config: { precision: number; scale: number }
  configRequired: true
}>({
  dataType: ({ precision, scale }) => `decimal(${precision},${scale})`,
  fromDriver: Number,
  toDriver: String,
})

/** A temperature in °C, to a thousandth. */
export const celsiusColumn = () => decimalNumber({ precision: 8, scale: 3 })

/** A temperature difference in K, to a thousandth. */
export const kelvinColumn = () => decimalNumber({ precision: 8, scale: 3 })

/** A length in m, to a millimetre. */
export const metresColumn = () => decimalNumber({ precision: 8, scale: 3 })

/** Key of a row, and of a column that points at one. */
export const idColumn = () => int({ unsigned: true })

/** Counts the writes to a row; a write names the version it was based on. */
export const versionColumn = () => int({ unsigned: true }).notNull().default(1)

/** Order within its aircraft or run. */
export const positionColumn = () => int({ unsigned: true }).notNull()

/** An instant in UTC, to a millisecond. */
export const instantColumn = () => datetime({ mode: 'date', fsp: 3 })

/** When the row was written first; set by the application, whose clock is UTC whatever the server's zone is. */
export const createdAtColumn = () =>
  instantColumn()
    .notNull()
    .$defaultFn(() => new Date())

/** When the row was written last. */
export const updatedAtColumn = () => createdAtColumn().$onUpdateFn(() => new Date())

/**
 * A JSON object or array. MariaDB keeps JSON as text, and whether the driver hands it over parsed depends on both
 * their versions; here it comes back parsed from either.
 */
export function jsonColumn<Data extends object>() {
  return customType<{ data: Data; driverData: string }>({
    dataType: () => 'json',
    fromDriver: (value): Data => (typeof value === 'string' ? (JSON.parse(value) as Data) : value),
    toDriver: (value) => JSON.stringify(value),
  })()
}
