import { beforeAll, describe, expect, it } from 'vitest'
import type { Role, RouteAccess, RouteKey } from '#shared/domain/permissions'
import { may, ROLES, ROUTES } from '#shared/domain/permissions'
import type { Aircraft, ChannelTable, Display, ZoneGrid } from '#shared/types/workbook'
import { database } from '~~/server/db/client'
import { addMemberships } from '~~/server/repositories/memberships'
import { aircraftInput, probeInput, runInput } from '../../factories/records'
import { asOwner, useTestDatabase } from '../support/database'
import type { Answer, Method, TestAccount } from '../support/http'
import { makeAccount, send } from '../support/http'
import { resetDatabase } from '../support/reset'
import type { Facts } from './requests'
import { SAMPLES } from './requests'

useTestDatabase()

type Walker = Role | 'outsider' | 'anonymous'
const WALKERS: readonly Walker[] = [...ROLES, 'outsider', 'anonymous']
const KEYS = Object.keys(ROUTES) as RouteKey[]
const isRole = (walker: Walker): walker is Role => ROLES.some((role) => role === walker)

type Verdict = 'let in' | 401 | 403 | 404

/** What the table of routes and the matrix of roles promise. */
function promised(access: RouteAccess, walker: Walker): Verdict {
  if (access === 'public') return 'let in'
  if (walker === 'anonymous') return 401
  if (access === 'signed-in') return 'let in'
  if (!isRole(walker)) return 404
  return may([walker], access) ? 'let in' : 403
}

const people = new Map<Walker, TestAccount>()
let facts: Omit<Facts, 'email'>
let names = 0

async function read<Body>(path: string, cookie: string): Promise<Body> {
  const { status, body } = await send<Body>('GET', path, { cookie })
  expect(status).toBe(200)
  return body
}

const first = <Item>(items: readonly Item[]): Item => {
  const [item] = items
  if (item === undefined) throw new Error('The test aircraft lacks a record.')
  return item
}

beforeAll(async () => {
  await resetDatabase()
  const creator = await makeAccount()
  const created = await send<{ aircraft: Aircraft }>('POST', '/api/aircraft', {
    cookie: creator.cookie,
    json: aircraftInput(),
  })
  const { id: aircraftId } = created.body.aircraft
  const path = `/api/aircraft/${aircraftId}`
  const grid = await read<ZoneGrid>(`${path}/zones`, creator.cookie)
  const { displays } = await read<{ displays: Display[] }>(`${path}/displays`, creator.cookie)
  const { rows } = await read<ChannelTable>(`${path}/channels`, creator.cookie)
  const ids = {
    aircraftId,
    zoneId: first(grid.zones).id,
    stateId: first(grid.states).id,
    displayId: first(displays).id,
    channelId: first(rows.items).channel.id,
  }
  const channel = `${path}/channels/${ids.channelId}`
  for (const [what, json] of [
    ['probe', probeInput()],
    ['run', { version: null, run: runInput(ids.zoneId) }],
  ] as const) {
    expect((await send('PUT', `${channel}/${what}`, { cookie: creator.cookie, json })).status).toBe(200)
  }
  facts = { ids, unique: () => `walk-${++names}` }
  for (const walker of WALKERS) {
    if (walker === 'anonymous') continue
    const person = await makeAccount(walker)
    people.set(walker, person)
    if (isRole(walker)) await addMemberships(database(), aircraftId, person.account.id, [walker])
  }
}, 60_000)

/** Sends the sample request of a route as one of the walkers. */
function walk(key: RouteKey, walker: Walker): Promise<Answer<unknown>> {
  const person = people.get(walker) ?? first([...people.values()])
  const { query = '', json } = SAMPLES[key]({ ...facts, email: person.email })
  const [method = '', pattern = ''] = key.split(' ')
  const path = Object.entries(facts.ids).reduce(
    (text, [name, id]) => text.replace(`:${name}`, String(id)),
    pattern,
  )
  const cookie = walker === 'anonymous' ? undefined : person.cookie
  return send(method as Method, path + query, { cookie, json })
}

const eventsStored = async () => {
  const [rows] = await asOwner((owner) => owner.query('SELECT COUNT(*) AS total FROM audit_events'))
  return (rows as { total: number }[])[0]?.total
}

describe.each(KEYS)('%s', (key) => {
  const cases = WALKERS.map((walker) => [walker, promised(ROUTES[key], walker)] as const)

  it.each(cases)('%s: %s', async (walker, verdict) => {
    const before = await eventsStored()
    const { status, body } = await walk(key, walker)
    if (verdict === 'let in') {
      expect([200, 201, 204, 409, 422], JSON.stringify(body)).toContain(status)
      return
    }
    expect(status, JSON.stringify(body)).toBe(verdict)
    expect(body).toMatchObject({ status: verdict })
    expect(await eventsStored()).toBe(before)
  })
})

describe('the walk itself', () => {
  it('sees somebody let in and somebody kept out wherever a permission is demanded', () => {
    for (const key of KEYS.filter((name) => name.includes(':aircraftId'))) {
      const verdicts = WALKERS.map((walker) => promised(ROUTES[key], walker))
      expect(verdicts).toContain('let in')
      expect(verdicts).toContain(404)
      expect(verdicts).toContain(401)
    }
  })

  it('meets the validation of the one request made wrong on purpose, and of no other', async () => {
    const refused: RouteKey[] = []
    for (const key of KEYS) if ((await walk(key, 'owner')).status === 422) refused.push(key)
    expect(refused).toEqual(['POST /api/account/password'])
  })

  it('tells an outsider of an aircraft what it tells of one that does not exist', async () => {
    const outsider = first([people.get('outsider')].flatMap((person) => person ?? []))
    const there = await send('GET', `/api/aircraft/${facts.ids.aircraftId}`, { cookie: outsider.cookie })
    const nowhere = await send('GET', '/api/aircraft/999999', { cookie: outsider.cookie })
    expect(there.status).toBe(404)
    expect(there.body).toEqual(nowhere.body)
  })
})
