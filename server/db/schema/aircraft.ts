import { mysqlEnum, mysqlTable, primaryKey, varchar } from 'drizzle-orm/mysql-core'
import { ROLES } from '../../../shared/domain/permissions/roles'
import type { EngineLayout } from '../../../shared/schemas/aircraft'
import { CABLE_STANDARDS } from '../../../shared/schemas/aircraft'
import {
  createdAtColumn,
  idColumn,
  instantColumn,
  jsonColumn,
  updatedAtColumn,
  versionColumn,
} from '../columns'
import { users } from './users'

export const aircraft = mysqlTable('aircraft', {
  id: idColumn().autoincrement().primaryKey(),
  name: varchar({ length: 80 }).notNull(),
  registration: varchar({ length: 20 }).notNull(),
  cableStandard: mysqlEnum(CABLE_STANDARDS).notNull(),
  /** The engine as chosen when the aircraft was laid out. */
  layout: jsonColumn<EngineLayout>().notNull(),
  archivedAt: instantColumn(),
  version: versionColumn(),
  createdBy: idColumn()
    .notNull()
    .references(() => users.id, { onDelete: 'restrict' }),
  createdAt: createdAtColumn(),
  updatedAt: updatedAtColumn(),
})

/** One role of one person on one aircraft; a person may hold several. */
export const memberships = mysqlTable(
  'memberships',
  {
    aircraftId: idColumn()
      .notNull()
      .references(() => aircraft.id, { onDelete: 'cascade' }),
    userId: idColumn()
      .notNull()
      .references(() => users.id, { onDelete: 'restrict' }),
    role: mysqlEnum(ROLES).notNull(),
    createdAt: createdAtColumn(),
  },
  (table) => [primaryKey({ columns: [table.aircraftId, table.userId, table.role] })],
)
