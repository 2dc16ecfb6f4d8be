import { sql } from 'drizzle-orm'
import { check, int, mysqlEnum, mysqlTable, unique, varchar } from 'drizzle-orm/mysql-core'
import { QUANTITIES } from '../../../shared/schemas/aircraft'
import { SENSORS } from '../../../shared/schemas/channel'
import { PROBE_STYLES, TIP_STYLES } from '../../../shared/schemas/probe'
import { LETTER_TYPES } from '../../../shared/thermometry/its90'
import {
  celsiusColumn,
  createdAtColumn,
  idColumn,
  instantColumn,
  metresColumn,
  positionColumn,
  updatedAtColumn,
  versionColumn,
} from '../columns'
import { aircraft } from './aircraft'
import { displays } from './displays'
import { zones } from './zones'

/** One measured quantity at one place. */
export const channels = mysqlTable(
  'channels',
  {
    id: idColumn().autoincrement().primaryKey(),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    tag: varchar({ length: 20 }).notNull(),
    quantity: mysqlEnum(QUANTITIES).notNull(),
    cylinder: int({ unsigned: true }),
    sensor: mysqlEnum(SENSORS).notNull(),
    thermocoupleType: mysqlEnum(LETTER_TYPES),
    tipZoneId: idColumn().references(() => zones.id, { onDelete: 'restrict' }),
    displayId: idColumn().references(() => displays.id, { onDelete: 'restrict' }),
    inputNumber: int({ unsigned: true }),
    typeSetting: mysqlEnum(LETTER_TYPES),
    workingLowCelsius: celsiusColumn(),
    workingHighCelsius: celsiusColumn(),
    notes: varchar({ length: 2000 }).notNull(),
    position: positionColumn(),
    version: versionColumn(),
    createdAt: createdAtColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [
    unique('channels_aircraft_tag').on(table.aircraftId, table.tag),
    unique('channels_display_input').on(table.displayId, table.inputNumber),
    check(
      'channels_type_goes_with_thermocouple',
      sql`(${table.sensor} = 'thermocouple') = (${table.thermocoupleType} is not null)`,
    ),
    check(
      'channels_setting_goes_with_thermocouple',
      sql`${table.sensor} = 'thermocouple' or ${table.typeSetting} is null`,
    ),
    check(
      'channels_display_goes_with_input',
      sql`(${table.displayId} is null) = (${table.inputNumber} is null)`,
    ),
    check('channels_range_ascends', sql`${table.workingLowCelsius} < ${table.workingHighCelsius}`),
  ],
)

/** The probe fitted to a channel. */
export const probes = mysqlTable('probes', {
  id: idColumn().autoincrement().primaryKey(),
  aircraftId: idColumn()
    .notNull()
    .references(() => aircraft.id, { onDelete: 'restrict' }),
  channelId: idColumn()
    .notNull()
    .unique('probes_channel')
    .references(() => channels.id, { onDelete: 'cascade' }),
  marking: varchar({ length: 60 }).notNull(),
  thermocoupleType: mysqlEnum(LETTER_TYPES),
  tipStyle: mysqlEnum(TIP_STYLES).notNull(),
  style: mysqlEnum(PROBE_STYLES).notNull(),
  leadLengthMetres: metresColumn(),
  notes: varchar({ length: 2000 }).notNull(),
  loggedAt: instantColumn().notNull(),
  version: versionColumn(),
})
