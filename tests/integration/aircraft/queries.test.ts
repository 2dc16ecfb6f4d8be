import type { RowDataPacket } from 'mysql2/promise'
import mysql from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'
import { runInput } from '../../factories/records'
import type { Workbook } from '../../factories/workbook'
import { createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

let watcher: mysql.Connection
let small: Workbook
let large: Workbook

/** An aircraft on which every cylinder's exhaust temperature is wired. */
async function wiredAircraft(cylinders: number): Promise<Workbook> {
  const layout = {
    cylinders,
    cooling: 'air',
    ignition: 'two-magnetos',
    quantities: ['exhaust-gas-temperature'],
  } as const
  const book = await createWorkbook({ layout: { ...layout, quantities: [...layout.quantities] } })
  const run = runInput(book.zone('Engine bay').id)
  for (let cylinder = 1; cylinder <= cylinders; cylinder++) {
    const { id } = book.channel(`EGT ${cylinder}`)
    await book.client.must('PUT', `${book.path}/channels/${id}/run`, { version: null, run })
  }
  return book
}

async function statements(): Promise<number> {
  const [rows] = await watcher.query<RowDataPacket[]>("SHOW GLOBAL STATUS LIKE 'Com_select'")
  return Number(rows[0]?.Value)
}

/** How many times a request reads from the database. */
async function readsOf(request: () => Promise<unknown>): Promise<number> {
  const before = await statements()
  await request()
  return (await statements()) - before
}

beforeAll(async () => {
  await resetDatabase()
  watcher = await mysql.createConnection({ uri: inject('ownerDatabaseUrl') })
  small = await wiredAircraft(1)
  large = await wiredAircraft(8)
}, 60_000)

afterAll(() => watcher.end())

describe('the number of queries does not grow with the aircraft', () => {
  it.each<[string, (book: Workbook) => Promise<unknown>]>([
    ['the channel table', ({ client, path }) => client.must('GET', `${path}/channels`)],
    ['the aircraft sheet', ({ client, path }) => client.must('GET', path)],
    [
      'the channel sheet',
      (book) => book.client.must('GET', `${book.path}/channels/${book.channel('EGT 1').id}`),
    ],
    ['the zones', ({ client, path }) => client.must('GET', `${path}/zones`)],
    [
      'a zone temperature, with every channel solved again',
      ({ client, path, grid, zone }) =>
        client.must('PUT', `${path}/states/${grid.states[0]?.id}/temperatures/${zone('Cabin').id}`, {
          version: 1,
          celsius: 25,
        }),
    ],
  ])('%s', async (_name, request) => {
    const reads = await readsOf(() => request(small))
    expect(reads).toBeGreaterThan(0)
    expect(await readsOf(() => request(large))).toBe(reads)
  })

  it('the list of aircraft', async () => {
    const list = () => large.client.must('GET', '/api/aircraft')
    const reads = await readsOf(list)
    await large.client.must('POST', '/api/aircraft', {
      name: 'Another',
      registration: '',
      cableStandard: 'astm-e230',
      displayName: 'Gauge',
      layout: large.aircraft.layout,
    })
    expect(await readsOf(list)).toBe(reads)
  })
})
