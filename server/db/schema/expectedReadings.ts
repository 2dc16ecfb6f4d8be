import { sql } from 'drizzle-orm'
import { check, mysqlEnum, mysqlTable, primaryKey } from 'drizzle-orm/mysql-core'
import type { FindingCode } from '../../../shared/thermometry/run/types'
import { celsiusColumn, decimalNumber, idColumn, instantColumn, jsonColumn } from '../columns'
import { aircraft } from './aircraft'
import { channels } from './channels'
import { operatingStates } from './zones'

const INDICATIONS = ['value', 'off-scale-low', 'off-scale-high', 'withheld'] as const

/** A temperature the solver found, °C or K: finer than what is entered, so that rounding shows nowhere. */
const solvedColumn = () => decimalNumber({ precision: 10, scale: 4 })

/** The run solver's answer for a channel in a state, rewritten with every record it rests on. */
export const expectedReadings = mysqlTable(
  'expected_readings',
  {
    channelId: idColumn()
      .notNull()
      .references(() => channels.id, { onDelete: 'cascade' }),
    stateId: idColumn()
      .notNull()
      .references(() => operatingStates.id, { onDelete: 'cascade' }),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    tipCelsius: celsiusColumn().notNull(),
    terminalMillivolts: decimalNumber({ precision: 12, scale: 6 }),
    indication: mysqlEnum(INDICATIONS).notNull(),
    indicatedCelsius: solvedColumn(),
    /** The end of the scale that was passed; null on the scale. */
    limitCelsius: solvedColumn(),
    errorKelvin: solvedColumn(),
    findingCodes: jsonColumn<FindingCode[]>().notNull(),
    solvedAt: instantColumn().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.channelId, table.stateId] }),
    check(
      'expected_readings_value_has_its_figure',
      sql`(${table.indication} = 'value') = (${table.indicatedCelsius} is not null)`,
    ),
    check(
      'expected_readings_off_scale_has_its_limit',
      sql`(${table.indication} in ('off-scale-low', 'off-scale-high')) = (${table.limitCelsius} is not null)`,
    ),
  ],
)
