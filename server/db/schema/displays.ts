import { sql } from 'drizzle-orm'
import { check, int, mysqlEnum, mysqlTable, unique, varchar } from 'drizzle-orm/mysql-core'
import { COMPENSATION_KINDS } from '../../../shared/thermometry/run/types'
import {
  celsiusColumn,
  createdAtColumn,
  decimalNumber,
  idColumn,
  kelvinColumn,
  updatedAtColumn,
  versionColumn,
} from '../columns'
import { aircraft } from './aircraft'
import { zones } from './zones'

/** The instrument that reads channels. */
export const displays = mysqlTable(
  'displays',
  {
    id: idColumn().autoincrement().primaryKey(),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    name: varchar({ length: 80 }).notNull(),
    inputs: int({ unsigned: true }).notNull(),
    terminalZoneId: idColumn()
      .notNull()
      .references(() => zones.id, { onDelete: 'restrict' }),
    compensationKind: mysqlEnum(COMPENSATION_KINDS).notNull(),
    /** Assumed temperature of a fixed compensation, or the ambient a gauge was zeroed to; null for the others. */
    compensationCelsius: celsiusColumn(),
    /** By how much a cold-junction sensor reads too high; null where the display has none. */
    sensorOffsetKelvin: kelvinColumn(),
    gainErrorFraction: decimalNumber({ precision: 9, scale: 6 }).notNull(),
    offsetKelvin: kelvinColumn().notNull(),
    lowCelsius: celsiusColumn(),
    highCelsius: celsiusColumn(),
    notes: varchar({ length: 2000 }).notNull(),
    version: versionColumn(),
    createdAt: createdAtColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [
    unique('displays_aircraft_name').on(table.aircraftId, table.name),
    check('displays_have_inputs', sql`${table.inputs} between 1 and 64`),
    check(
      'displays_compensation_has_its_figure',
      sql`(${table.compensationKind} in ('fixed', 'zeroed')) = (${table.compensationCelsius} is not null)`,
    ),
    check(
      'displays_sensor_has_its_offset',
      sql`(${table.compensationKind} in ('internal', 'remote-block', 'adds-degrees')) = (${table.sensorOffsetKelvin} is not null)`,
    ),
    check('displays_range_ascends', sql`${table.lowCelsius} < ${table.highCelsius}`),
  ],
)
