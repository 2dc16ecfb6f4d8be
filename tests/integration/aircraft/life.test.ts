import { beforeAll, describe, expect, inject, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type {
  Aircraft,
  AircraftListItem,
  AircraftSheet,
  HistoryEvent,
  Page,
  Person,
} from '#shared/types/workbook'
import { signUp } from '../../factories/client'
import { aircraftInput, probeInput, runInput } from '../../factories/records'
import { filledTables } from '../../factories/tables'
import { channelRows, createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

const OF_ACCOUNTS = ['users', 'sign_in_attempts']

describe('a new aircraft', () => {
  it('is laid out with zones, states, temperatures, a display and channels', async () => {
    const { client, path, grid, display } = await createWorkbook()
    expect(grid.states.map((state) => state.name)).toEqual([
      'Hangar',
      'Cold start',
      'Ground idle',
      'Climb',
      'Cruise',
      'Heat soak',
    ])
    expect(grid.temperatures).toHaveLength(grid.states.length * grid.zones.length)
    expect(grid.zones.find((zone) => zone.id === display.terminalZoneId)?.name).toBe('Display terminals')
    const rows = await channelRows(client, path)
    expect(rows.map(({ channel }) => channel.tag)).toEqual(['EGT 1', 'EGT 2', 'CHT 1', 'CHT 2', 'OIL P'])
    expect(rows.map(({ standing }) => standing)).toEqual([...Array(4).fill('planned'), 'record-only'])
    expect(rows[0]).toMatchObject({ displayName: 'Engine monitor', hasRun: false, readings: [] })
  })

  it('makes its creator owner and builder', async () => {
    const { client, path } = await createWorkbook()
    const sheet = await client.must<AircraftSheet>('GET', path)
    expect([...sheet.roles].sort()).toEqual(['builder', 'owner'])
    expect(sheet.people).toMatchObject([{ displayName: 'Test builder' }])
    expect(sheet.channels).toBe(5)
    expect(sheet.standings).toMatchObject({ planned: 4, 'record-only': 1, faults: 0 })
    const { people } = await client.must<{ people: Person[] }>('GET', `${path}/people`)
    expect(people).toEqual(sheet.people)
  })

  it('stands in the list of its own people and of nobody else', async () => {
    const { client, aircraft } = await createWorkbook()
    const own = await client.must<Page<AircraftListItem>>('GET', '/api/aircraft')
    expect(own).toMatchObject({ total: 1, page: 1, items: [{ aircraft: { id: aircraft.id }, channels: 5 }] })
    const stranger = await signUp()
    expect(await stranger.must('GET', '/api/aircraft')).toMatchObject({ total: 0, items: [] })
    expect((await stranger.get(`/api/aircraft/${aircraft.id}`)).status).toBe(404)
  })

  it('is refused when its engine cannot have what is asked for', async () => {
    const client = await signUp()
    const layout = { ...aircraftInput().layout, quantities: ['coolant-temperature'] }
    const { status, body } = await client.send<Problem>('POST', '/api/aircraft', {
      ...aircraftInput(),
      layout,
    })
    expect(status).toBe(422)
    expect(body.errors).toEqual([
      { field: 'layout.quantities', reason: 'An air-cooled engine has no coolant to measure.' },
    ])
  })

  it('comes in pages', async () => {
    const client = await signUp()
    for (const name of ['Alder', 'Birch', 'Cedar'])
      await client.must('POST', '/api/aircraft', aircraftInput({ name }))
    const second = await client.must<Page<AircraftListItem>>('GET', '/api/aircraft?page=2&pageSize=2')
    expect(second).toMatchObject({ total: 3, page: 2, pageSize: 2 })
    expect(second.items).toHaveLength(1)
  })
})

describe('the life of an aircraft', () => {
  it('is renamed, archived, restored and deleted', async () => {
    const { client, aircraft, path } = await createWorkbook()
    const renamed = await client.must<{ aircraft: Aircraft }>('PATCH', path, {
      version: aircraft.version,
      name: 'Renamed',
      registration: '',
      cableStandard: 'iec-60584-3',
    })
    expect(renamed.aircraft).toMatchObject({ name: 'Renamed', version: aircraft.version + 1 })

    const archived = await client.must<{ aircraft: Aircraft }>('POST', `${path}/archive`, {
      version: renamed.aircraft.version,
    })
    expect(archived.aircraft.archivedAt).not.toBeNull()
    expect(await client.must('GET', '/api/aircraft')).toMatchObject({ total: 0 })
    expect(await client.must('GET', '/api/aircraft?archived=true')).toMatchObject({ total: 1 })

    const restored = await client.must<{ aircraft: Aircraft }>('POST', `${path}/restore`, {
      version: archived.aircraft.version,
    })
    expect(restored.aircraft.archivedAt).toBeNull()

    const gone = await client.send('DELETE', `${path}?version=${restored.aircraft.version}`)
    expect(gone.status).toBe(204)
    expect((await client.get(path)).status).toBe(404)
  })

  it('leaves its history and nothing else when it is deleted', async () => {
    await resetDatabase()
    const { client, aircraft, path, channel, zone } = await createWorkbook()
    await client.must('PUT', `${path}/channels/${channel('EGT 1').id}/probe`, probeInput())
    await client.must('PUT', `${path}/channels/${channel('EGT 1').id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })
    await client.must('DELETE', `${path}?version=${aircraft.version}`)
    const left = await filledTables(inject('databaseUrl'))
    expect(left.filter((name) => !OF_ACCOUNTS.includes(name))).toEqual(['audit_chains', 'audit_events'])
  })

  it('refuses every write while archived, but not reading, restoring or deleting', async () => {
    const { client, aircraft, path, grid, zone } = await createWorkbook()
    const { aircraft: archived } = await client.must<{ aircraft: Aircraft }>('POST', `${path}/archive`, {
      version: aircraft.version,
    })
    const refusals = await Promise.all([
      client.send<Problem>('POST', `${path}/zones`, { name: 'Nook', kind: 'other', celsius: 20 }),
      client.send<Problem>(
        'PUT',
        `${path}/states/${grid.states[0]?.id}/temperatures/${zone('Engine bay').id}`,
        {
          version: 1,
          celsius: 30,
        },
      ),
      client.send<Problem>('POST', `${path}/archive`, { version: archived.version }),
    ])
    expect(refusals.map(({ status, body }) => [status, body.code])).toEqual(Array(3).fill([409, 'conflict']))
    expect((await client.get(path)).status).toBe(200)
    expect((await client.send('DELETE', `${path}?version=${archived.version}`)).status).toBe(204)
  })
})

describe('two people editing one aircraft', () => {
  it('the later one is refused and told what changed', async () => {
    const { client, aircraft, path } = await createWorkbook()
    const edit = (name: string) => ({
      version: aircraft.version,
      name,
      registration: aircraft.registration,
      cableStandard: aircraft.cableStandard,
    })
    await client.must('PATCH', path, edit('First'))
    const { status, body } = await client.send<Problem>('PATCH', path, edit('Second'))
    expect(status).toBe(409)
    expect(body.code).toBe('stale-version')
    expect(body.changed).toMatchObject({
      version: aircraft.version + 1,
      fields: [{ field: 'name', current: 'First' }],
      changedBy: 'Test builder',
    })
    expect(await client.must('GET', path)).toMatchObject({ aircraft: { name: 'First' } })
  })

  it('at the same moment: exactly one of them wins', async () => {
    const { client, aircraft, path } = await createWorkbook()
    const answers = await Promise.all(
      ['One', 'Two', 'Three', 'Four'].map((name) =>
        client.send('PATCH', path, {
          version: aircraft.version,
          name,
          registration: '',
          cableStandard: aircraft.cableStandard,
        }),
      ),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409])
  })
})

describe('history', () => {
  it('tells who did what, newest first, before and after', async () => {
    const { client, aircraft, path } = await createWorkbook()
    await client.must('PATCH', path, {
      version: aircraft.version,
      name: 'Renamed',
      registration: aircraft.registration,
      cableStandard: aircraft.cableStandard,
    })
    const history = await client.must<Page<HistoryEvent>>('GET', `${path}/history?pageSize=1`)
    expect(history.total).toBeGreaterThan(1)
    expect(history.items).toMatchObject([
      {
        actorName: 'Test builder',
        entity: 'aircraft',
        entityId: aircraft.id,
        before: { name: 'Test two-seat' },
        after: { name: 'Renamed' },
      },
    ])
  })
})
