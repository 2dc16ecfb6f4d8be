import { beforeAll, describe, expect, inject, it } from 'vitest'
import { aircraftChain, verifyAuditChain } from '~~/server/audit'
import { closeDatabase, database, openDatabase } from '~~/server/db/client'
import { seedDemo } from '~~/server/demo/seed'
import type { AircraftListItem, AircraftSheet, ChannelRow, HistoryEvent, Page } from '#shared/types/workbook'
import { Client } from '../../factories/client'
import { channelRows } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

const FAULTS: Readonly<Record<string, string[]>> = {
  'EGT 2': ['stray-junction', 'wrong-conductor'],
  'CHT 2': ['harmless-metal', 'stray-junction', 'wrong-conductor'],
  'CHT 3': ['legs-swapped', 'stray-junction'],
  'CHT 4': ['display-type-mismatch'],
  'INTAKE AIR': ['compensation-error'],
  OAT: ['compensation-error'],
}
const RIGHT = ['EGT 1', 'EGT 3', 'EGT 4', 'CHT 1', 'OIL T']

async function signIn(email: string, password: string): Promise<Client> {
  const client = new Client()
  await client.must('POST', '/api/auth/sign-in', { email, password })
  return client
}

async function ownAircraft(client: Client): Promise<AircraftListItem> {
  const { items } = await client.must<Page<AircraftListItem>>('GET', '/api/aircraft')
  const [item] = items
  if (!item) throw new Error('no aircraft')
  return item
}

let outcome: Awaited<ReturnType<typeof seedDemo>>
let owner: Client
let rows: ChannelRow[]
let path: string

beforeAll(async () => {
  await resetDatabase()
  outcome = await seedDemo(inject('databaseUrl'))
  const { email, password } = accountOf('owner')
  owner = await signIn(email, password)
  path = `/api/aircraft/${(await ownAircraft(owner)).aircraft.id}`
  rows = await channelRows(owner, path)
})

function accountOf(role: string) {
  const account = outcome.accounts.find((one) => one.role === role)
  if (!account) throw new Error(`no ${role}`)
  return account
}

describe('the demo', () => {
  it('has an account for each role, which sees the aircraft in that role', async () => {
    expect(outcome.seeded).toBe(true)
    for (const role of ['owner', 'builder', 'inspector', 'mentor']) {
      const { email, password } = accountOf(role)
      const { roles } = await ownAircraft(await signIn(email, password))
      expect(roles).toContain(role)
    }
  })

  it('has at least 14 channels, wired and read', () => {
    expect(rows.length).toBeGreaterThanOrEqual(14)
    const wired = rows.filter((row) => row.channel.sensor === 'thermocouple')
    expect(wired.every((row) => row.hasProbe && row.hasRun && row.readings.length === 6)).toBe(true)
  })

  it('finds the five faults that were built in, and nothing on the channels that are right', () => {
    const found = Object.fromEntries(
      rows
        .filter((row) => row.standing === 'faults')
        .map((row) => [row.channel.tag, [...row.findingCodes].sort()]),
    )
    expect(found).toEqual(FAULTS)
    const right = rows.filter((row) => row.standing === 'as-intended')
    expect(right.map((row) => row.channel.tag)).toEqual(RIGHT)
    for (const row of right) {
      expect(row.findingCodes).toEqual([])
      expect(row.worstErrorKelvin).toBe(0)
    }
  })

  it('stands the same on the aircraft sheet', async () => {
    const sheet = await owner.must<AircraftSheet>('GET', path)
    expect(sheet.standings).toMatchObject({ faults: 6, 'as-intended': 5, planned: 0 })
    expect(sheet.people).toHaveLength(4)
  })

  it('has a history by several people, and its chain holds', async () => {
    const history = await owner.must<Page<HistoryEvent>>('GET', `${path}/history?pageSize=200`)
    expect(new Set(history.items.map((event) => event.actorName)).size).toBeGreaterThan(1)
    openDatabase(inject('databaseUrl'))
    const verdict = await verifyAuditChain(database(), aircraftChain(Number(path.split('/').at(-1))))
    await closeDatabase()
    expect(verdict).toEqual({ intact: true, events: history.total })
  })

  it('is loaded once, and tells which accounts still have their password', async () => {
    const { email, password } = accountOf('mentor')
    const mentor = await signIn(email, password)
    await mentor.must('POST', '/api/account/password', {
      currentPassword: password,
      newPassword: 'another password',
    })
    const again = await seedDemo(inject('databaseUrl'))
    expect(again.seeded).toBe(false)
    expect(again.accounts.map(({ role }) => role)).toEqual(['owner', 'builder', 'inspector'])
  })

  it('is refused in production', async () => {
    const before = process.env.COWLBOOK_ENV
    process.env.COWLBOOK_ENV = 'production'
    try {
      expect(await seedDemo(inject('databaseUrl'))).toMatchObject({ seeded: false, accounts: [] })
    } finally {
      if (before === undefined) delete process.env.COWLBOOK_ENV
      else process.env.COWLBOOK_ENV = before
    }
  })
})
