import type { Connection } from 'mysql2/promise'
import { beforeEach, describe, expect, it } from 'vitest'
import { databaseErrno, ERRNO } from '~~/server/db/errors'
import { asOwner } from '../support/database'
import { resetDatabase } from '../support/reset'

const NOW = "'2026-01-01 00:00:00.000'"
const CHANNEL = `INSERT INTO channels (aircraft_id, quantity, notes, position, created_at, updated_at,
  tag, sensor, thermocouple_type, type_setting, tip_zone_id, display_id, input_number,
  working_low_celsius, working_high_celsius) VALUES (1, 'exhaust-gas-temperature', '', 1, ${NOW}, ${NOW},`
const DISPLAY = `INSERT INTO displays (aircraft_id, inputs, terminal_zone_id, gain_error_fraction, offset_kelvin,
  notes, created_at, updated_at, name, compensation_kind, compensation_celsius, sensor_offset_kelvin,
  low_celsius, high_celsius) VALUES (1, 4, 1, 0, 0, '', ${NOW}, ${NOW},`
const READING = `INSERT INTO expected_readings (channel_id, state_id, aircraft_id, tip_celsius, finding_codes,
  solved_at, indication, indicated_celsius, limit_celsius) VALUES (1, 1, 1, 20, '[]', ${NOW},`

/** The least that the statements below can stand on: one of everything, each with the id 1. */
const FOUNDATION = [
  `INSERT INTO users (email, display_name, password_hash, created_at, updated_at)
    VALUES ('a@example.org', 'A', 'x', ${NOW}, ${NOW})`,
  `INSERT INTO aircraft (name, registration, cable_standard, layout, created_by, created_at, updated_at)
    VALUES ('A', '', 'astm-e230', '{}', 1, ${NOW}, ${NOW})`,
  `INSERT INTO zones (aircraft_id, name, kind, position, created_at, updated_at)
    VALUES (1, 'Bay', 'engine-bay', 1, ${NOW}, ${NOW})`,
  `INSERT INTO operating_states (aircraft_id, name, position, created_at, updated_at)
    VALUES (1, 'Climb', 1, ${NOW}, ${NOW})`,
  `${DISPLAY} 'Monitor', 'none', NULL, NULL, NULL, NULL)`,
  `${CHANNEL} 'EGT 1', 'thermocouple', 'K', 'K', 1, 1, 1, NULL, NULL)`,
  `INSERT INTO wiring_runs (aircraft_id, channel_id, terminals_crossed, terminals_positive_offset_kelvin,
    terminals_negative_offset_kelvin, saved_at) VALUES (1, 1, 0, 0, 0, ${NOW})`,
  `INSERT INTO run_sections (run_id, position, part_id, label, positive, negative)
    VALUES (1, 0, 's1', 'Probe', 'KP', 'KN')`,
  `INSERT INTO memberships (aircraft_id, user_id, role, created_at) VALUES (1, 1, 'owner', ${NOW})`,
]

async function runAll(owner: Connection, statements: readonly string[]): Promise<void> {
  for (const statement of statements) await owner.query(statement)
}

/** The number under which the database refuses a statement; undefined when it takes it. */
async function refusalOf(statement: string): Promise<number | undefined> {
  return await asOwner((owner) =>
    owner.query(statement).then(
      () => undefined,
      (error: unknown) => databaseErrno(error),
    ),
  )
}

beforeEach(async () => {
  await resetDatabase()
  await asOwner((owner) => runAll(owner, FOUNDATION))
})

describe('what does not go together is refused', () => {
  it.each([
    [
      'a thermocouple without a type',
      `${CHANNEL} 'X', 'thermocouple', NULL, NULL, 1, NULL, NULL, NULL, NULL)`,
    ],
    ['a type without a thermocouple', `${CHANNEL} 'X', 'pulse', 'K', NULL, NULL, NULL, NULL, NULL, NULL)`],
    ['a setting without a thermocouple', `${CHANNEL} 'X', 'pulse', NULL, 'K', NULL, NULL, NULL, NULL, NULL)`],
    ['a display without an input', `${CHANNEL} 'X', 'pulse', NULL, NULL, NULL, 1, NULL, NULL, NULL)`],
    ['an input without a display', `${CHANNEL} 'X', 'pulse', NULL, NULL, NULL, NULL, 2, NULL, NULL)`],
    ['a working range upside down', `${CHANNEL} 'X', 'pulse', NULL, NULL, NULL, NULL, NULL, 90, 10)`],
    ['a fixed compensation without a figure', `${DISPLAY} 'X', 'fixed', NULL, NULL, NULL, NULL)`],
    ['a figure without a fixed compensation', `${DISPLAY} 'X', 'none', 20, NULL, NULL, NULL)`],
    ['an internal sensor without an offset', `${DISPLAY} 'X', 'internal', NULL, NULL, NULL, NULL)`],
    ['a display range upside down', `${DISPLAY} 'X', 'none', NULL, NULL, 100, 0)`],
    ['a value without a figure', `${READING} 'value', NULL, NULL)`],
    ['a figure that is off scale', `${READING} 'off-scale-low', 20, -50)`],
    ['off scale without the end of the scale', `${READING} 'off-scale-high', NULL, NULL)`],
    ['a zone below absolute zero', `INSERT INTO zone_temperatures VALUES (1, 1, 1, -273.151, 1, ${NOW})`],
    ['an e-mail address in capitals', "UPDATE users SET email = 'A@example.org'"],
    ['a display without inputs', 'UPDATE displays SET inputs = 0'],
  ])('%s', async (_, statement) => {
    expect(await refusalOf(statement)).toBe(ERRNO.check)
  })

  it.each([
    ['a channel that is complete', `${CHANNEL} 'X', 'thermocouple', 'K', NULL, 1, 1, 2, 10, 90)`],
    ['a channel that is only planned', `${CHANNEL} 'X', 'pulse', NULL, NULL, NULL, NULL, NULL, NULL, NULL)`],
    ['a fixed compensation', `${DISPLAY} 'X', 'fixed', 20, NULL, -50, 1000)`],
    ['an internal sensor', `${DISPLAY} 'X', 'internal', NULL, 0, NULL, NULL)`],
    ['a reading', `${READING} 'value', 20, NULL)`],
    ['a reading off scale', `${READING} 'off-scale-low', NULL, -50)`],
    ['absolute zero', `INSERT INTO zone_temperatures VALUES (1, 1, 1, -273.15, 1, ${NOW})`],
  ])('and what does is taken: %s', async (_, statement) => {
    expect(await refusalOf(statement)).toBeUndefined()
  })
})

describe('what there can be only one of is refused', () => {
  it.each([
    ['a tag, in capitals or not', `${CHANNEL} 'egt 1', 'pulse', NULL, NULL, NULL, NULL, NULL, NULL, NULL)`],
    ['an input', `${CHANNEL} 'X', 'pulse', NULL, NULL, NULL, 1, 1, NULL, NULL)`],
    [
      'a zone of a name',
      `INSERT INTO zones (aircraft_id, name, kind, position, created_at, updated_at)
      VALUES (1, 'bay', 'other', 2, ${NOW}, ${NOW})`,
    ],
    [
      'a part of a run',
      `INSERT INTO run_sections (run_id, position, part_id, label, positive, negative)
      VALUES (1, 1, 's1', 'Extension', 'KP', 'KN')`,
    ],
    [
      'a run of a channel',
      `INSERT INTO wiring_runs SELECT 2, aircraft_id, channel_id, 0, 0, 0, saved_at, 1
      FROM wiring_runs`,
    ],
    [
      'an account of an address',
      `INSERT INTO users (email, display_name, password_hash, created_at, updated_at)
      VALUES ('a@example.org', 'B', 'x', ${NOW}, ${NOW})`,
    ],
  ])('%s', async (_, statement) => {
    expect(await refusalOf(statement)).toBe(ERRNO.duplicate)
  })
})

describe('what others lean on stays', () => {
  it.each([['zones'], ['displays'], ['aircraft'], ['users']])('%s', async (table) => {
    expect(await refusalOf(`DELETE FROM ${table}`)).toBe(ERRNO.stillReferenced)
  })

  it('and what is part of a record goes with it', async () => {
    await asOwner((owner) => runAll(owner, ['DELETE FROM channels']))
    for (const table of ['wiring_runs', 'run_sections']) {
      const [rows] = await asOwner((owner) => owner.query(`SELECT * FROM ${table}`))
      expect(rows).toEqual([])
    }
  })
})
