import { sql } from 'drizzle-orm'
import { char, check, index, int, mysqlEnum, mysqlTable, varchar } from 'drizzle-orm/mysql-core'
// Relative, because drizzle-kit reads the schema without the aliases of the application.
import { GAUGE_UNITS, LENGTH_UNITS, TEMPERATURE_UNITS } from '../../../shared/schemas/account'
import { createdAtColumn, idColumn, instantColumn, updatedAtColumn } from '../columns'

export const users = mysqlTable(
  'users',
  {
    id: idColumn().autoincrement().primaryKey(),
    email: varchar({ length: 254 }).notNull().unique('users_email'),
    displayName: varchar({ length: 80 }).notNull(),
    passwordHash: varchar({ length: 255 }).notNull(),
    /** Sessions carry it; raising it ends them all. */
    sessionVersion: int({ unsigned: true }).notNull().default(1),
    temperatureUnit: mysqlEnum(TEMPERATURE_UNITS).notNull().default('celsius'),
    lengthUnit: mysqlEnum(LENGTH_UNITS).notNull().default('metre'),
    gaugeUnit: mysqlEnum(GAUGE_UNITS).notNull().default('awg'),
    createdAt: createdAtColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [
    check('users_email_lower_case', sql`${table.email} = lower(${table.email}) collate utf8mb4_bin`),
  ],
)

/** Attempts to sign in or register, counted over every instance of the application. */
export const signInAttempts = mysqlTable(
  'sign_in_attempts',
  {
    id: idColumn().autoincrement().primaryKey(),
    /** Hash of what is limited (an account or an address): the table tells nobody who tried. */
    subjectHash: char({ length: 64 }).notNull(),
    at: instantColumn().notNull(),
  },
  (table) => [
    index('sign_in_attempts_subject_at').on(table.subjectHash, table.at),
    index('sign_in_attempts_at').on(table.at),
  ],
)
