import { boolean, int, mysqlEnum, mysqlTable, primaryKey, unique, varchar } from 'drizzle-orm/mysql-core'
import { JOINT_KINDS } from '../../../shared/thermometry/run/types'
import type { Thermoelement } from '../../../shared/thermometry/thermoelements'
import {
  idColumn,
  instantColumn,
  kelvinColumn,
  metresColumn,
  positionColumn,
  versionColumn,
} from '../columns'
import { aircraft } from './aircraft'
import { channels } from './channels'
import { zones } from './zones'

/** A conductor's alloy. Text, not an enumeration: the list grows with the data published for single legs. */
const conductorColumn = () => varchar({ length: 20 }).$type<Thermoelement>()

/** Key of a part within its run, given by whoever drew it. */
const partIdColumn = () => varchar({ length: 36 }).notNull()

/** The ordered path from probe tip to display terminals. */
export const wiringRuns = mysqlTable('wiring_runs', {
  id: idColumn().autoincrement().primaryKey(),
  aircraftId: idColumn()
    .notNull()
    .references(() => aircraft.id, { onDelete: 'restrict' }),
  channelId: idColumn()
    .notNull()
    .unique('wiring_runs_channel')
    .references(() => channels.id, { onDelete: 'cascade' }),
  terminalsCrossed: boolean().notNull(),
  terminalsPositiveOffsetKelvin: kelvinColumn().notNull(),
  terminalsNegativeOffsetKelvin: kelvinColumn().notNull(),
  savedAt: instantColumn().notNull(),
  version: versionColumn(),
})

/** Sections of a run, tip to display. */
export const runSections = mysqlTable(
  'run_sections',
  {
    runId: idColumn()
      .notNull()
      .references(() => wiringRuns.id, { onDelete: 'cascade' }),
    position: positionColumn(),
    partId: partIdColumn(),
    label: varchar({ length: 60 }).notNull(),
    positive: conductorColumn().notNull(),
    negative: conductorColumn().notNull(),
    lengthMetres: metresColumn(),
    gaugeAwg: int({ unsigned: true }),
  },
  (table) => [
    primaryKey({ columns: [table.runId, table.position] }),
    unique('run_sections_run_part').on(table.runId, table.partId),
  ],
)

/** Joints of a run: the one at a position connects the sections at that position and at the next. */
export const runJoints = mysqlTable(
  'run_joints',
  {
    runId: idColumn()
      .notNull()
      .references(() => wiringRuns.id, { onDelete: 'cascade' }),
    position: positionColumn(),
    partId: partIdColumn(),
    label: varchar({ length: 60 }).notNull(),
    kind: mysqlEnum(JOINT_KINDS).notNull(),
    tipSideZoneId: idColumn()
      .notNull()
      .references(() => zones.id, { onDelete: 'restrict' }),
    displaySideZoneId: idColumn()
      .notNull()
      .references(() => zones.id, { onDelete: 'restrict' }),
    crossed: boolean().notNull(),
    positiveMetal: conductorColumn(),
    negativeMetal: conductorColumn(),
    positiveOffsetKelvin: kelvinColumn().notNull(),
    negativeOffsetKelvin: kelvinColumn().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.runId, table.position] }),
    unique('run_joints_run_part').on(table.runId, table.partId),
  ],
)
