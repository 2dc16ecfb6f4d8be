import { sql } from 'drizzle-orm'
import { check, mysqlEnum, mysqlTable, primaryKey, unique, varchar } from 'drizzle-orm/mysql-core'
import { ZONE_KINDS } from '../../../shared/schemas/zone'
import {
  celsiusColumn,
  createdAtColumn,
  idColumn,
  positionColumn,
  updatedAtColumn,
  versionColumn,
} from '../columns'
import { aircraft } from './aircraft'

/** A place with one temperature at a time. */
export const zones = mysqlTable(
  'zones',
  {
    id: idColumn().autoincrement().primaryKey(),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    name: varchar({ length: 60 }).notNull(),
    kind: mysqlEnum(ZONE_KINDS).notNull(),
    position: positionColumn(),
    version: versionColumn(),
    createdAt: createdAtColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [unique('zones_aircraft_name').on(table.aircraftId, table.name)],
)

/** A named set of zone temperatures. */
export const operatingStates = mysqlTable(
  'operating_states',
  {
    id: idColumn().autoincrement().primaryKey(),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    name: varchar({ length: 60 }).notNull(),
    position: positionColumn(),
    version: versionColumn(),
    createdAt: createdAtColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [unique('operating_states_aircraft_name').on(table.aircraftId, table.name)],
)

export const zoneTemperatures = mysqlTable(
  'zone_temperatures',
  {
    stateId: idColumn()
      .notNull()
      .references(() => operatingStates.id, { onDelete: 'cascade' }),
    zoneId: idColumn()
      .notNull()
      .references(() => zones.id, { onDelete: 'cascade' }),
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'restrict' }),
    celsius: celsiusColumn().notNull(),
    version: versionColumn(),
    updatedAt: updatedAtColumn(),
  },
  (table) => [
    primaryKey({ columns: [table.stateId, table.zoneId] }),
    check('zone_temperatures_above_absolute_zero', sql`${table.celsius} >= -273.15`),
  ],
)
