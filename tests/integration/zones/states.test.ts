import { beforeAll, describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { OperatingState, ZoneGrid, ZoneTemperature } from '#shared/types/workbook'
import { runInput } from '../../factories/records'
import type { Workbook } from '../../factories/workbook'
import { channelRows, createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

interface TemperatureAnswer {
  temperature: ZoneTemperature
  moved: { channelId: number; tag: string; beforeCelsius: number | null; afterCelsius: number | null }[]
}

function stateNamed({ grid }: Workbook, name: string): OperatingState {
  const state = grid.states.find((one) => one.name === name)
  if (!state) throw new Error(`no state ${name}`)
  return state
}

const logCopperRun = (book: Workbook, tag: string) =>
  book.client.must('PUT', `${book.path}/channels/${book.channel(tag).id}/run`, {
    version: null,
    run: runInput(book.zone('Engine bay').id, { positive: 'Cu', negative: 'Cu' }),
  })

describe('an operating state', () => {
  it('begins with the temperatures of another and is solved at once', async () => {
    const book = await createWorkbook()
    const { client, path, grid } = book
    await logCopperRun(book, 'CHT 1')
    const climb = stateNamed(book, 'Climb')
    const { state } = await client.must<{ state: OperatingState }>('POST', `${path}/states`, {
      name: 'Long climb',
      copyFromStateId: climb.id,
    })
    expect(state).toMatchObject({ name: 'Long climb', position: grid.states.length })
    const after = await client.must<ZoneGrid>('GET', `${path}/zones`)
    const celsiusIn = (id: number) =>
      after.temperatures.filter((one) => one.stateId === id).map((one) => [one.zoneId, one.celsius])
    expect(celsiusIn(state.id).sort()).toEqual(celsiusIn(climb.id).sort())
    const readings = (await channelRows(client, path)).find((row) => row.channel.tag === 'CHT 1')?.readings
    const readingIn = (id: number) => readings?.find((one) => one.stateId === id)
    expect(readingIn(state.id)).toEqual({ ...readingIn(climb.id), stateId: state.id })
  })

  it('is renamed and removed together with its readings, but not the last one', async () => {
    const book = await createWorkbook()
    const { client, path, grid } = book
    await logCopperRun(book, 'CHT 1')
    const [first, ...others] = grid.states
    await client.must('PATCH', `${path}/states/${first?.id}`, { version: first?.version, name: 'Shed' })
    for (const { id, version } of others)
      expect((await client.send('DELETE', `${path}/states/${id}?version=${version}`)).status).toBe(204)
    const rows = await channelRows(client, path)
    expect(rows.flatMap((row) => row.readings).map((reading) => reading.stateId)).toEqual([first?.id])
    const last = await client.send<Problem>(
      'DELETE',
      `${path}/states/${first?.id}?version=${(first?.version ?? 0) + 1}`,
    )
    expect([last.status, last.body.code]).toEqual([409, 'conflict'])
  })

  it('cannot bear the name of another, nor begin as one of another aircraft', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const duplicate = await mine.client.send<Problem>('POST', `${mine.path}/states`, {
      name: 'Cruise',
      copyFromStateId: stateNamed(mine, 'Climb').id,
    })
    expect([duplicate.status, duplicate.body.code]).toEqual([409, 'conflict'])
    const foreign = await mine.client.send<Problem>('POST', `${mine.path}/states`, {
      name: 'Other',
      copyFromStateId: stateNamed(theirs, 'Climb').id,
    })
    expect(foreign.status).toBe(422)
    expect(foreign.body.errors).toMatchObject([{ field: 'copyFromStateId' }])
  })
})

describe('a zone temperature', () => {
  it('moves the readings that rest on it, and says which and by how much', async () => {
    const book = await createWorkbook()
    const { client, path } = book
    await logCopperRun(book, 'CHT 1')
    const climb = stateNamed(book, 'Climb')
    const { moved, temperature } = await client.must<TemperatureAnswer>(
      'PUT',
      `${path}/states/${climb.id}/temperatures/${book.zone('Engine bay').id}`,
      { version: 1, celsius: 92 },
    )
    expect(temperature).toMatchObject({ celsius: 92, version: 2 })
    expect(moved.map(({ tag }) => tag)).toEqual(['CHT 1'])
    const [{ beforeCelsius, afterCelsius } = { beforeCelsius: null, afterCelsius: null }] = moved
    // The plug rose from 72 °C to 92 °C: a copper extension reads lower by about as much.
    expect((beforeCelsius ?? NaN) - (afterCelsius ?? NaN)).toBeGreaterThan(19)
    expect((beforeCelsius ?? NaN) - (afterCelsius ?? NaN)).toBeLessThan(22)
    const stored = (await channelRows(client, path))
      .find((row) => row.channel.tag === 'CHT 1')
      ?.readings.find((reading) => reading.stateId === climb.id)
    expect(stored?.indication).toEqual({ kind: 'value', celsius: afterCelsius })
  })

  it('moves nothing when every conductor in it is the right one', async () => {
    const book = await createWorkbook()
    const bay = book.zone('Engine bay').id
    await book.client.must('PUT', `${book.path}/channels/${book.channel('EGT 1').id}/run`, {
      version: null,
      run: runInput(bay),
    })
    const { moved } = await book.client.must<TemperatureAnswer>(
      'PUT',
      `${book.path}/states/${stateNamed(book, 'Climb').id}/temperatures/${bay}`,
      { version: 1, celsius: 110 },
    )
    expect(moved).toEqual([])
  })

  it('is refused when stale, below absolute zero, or of another aircraft', async () => {
    const [book, theirs] = [await createWorkbook(), await createWorkbook()]
    const { client, path } = book
    const cell = `${path}/states/${stateNamed(book, 'Cruise').id}/temperatures/${book.zone('Cabin').id}`
    await client.must('PUT', cell, { version: 1, celsius: 21 })
    const stale = await client.send<Problem>('PUT', cell, { version: 1, celsius: 22 })
    expect(stale.status).toBe(409)
    expect(stale.body.changed).toMatchObject({ version: 2, fields: [{ field: 'celsius', current: 21 }] })
    expect((await client.send('PUT', cell, { version: 2, celsius: -300 })).status).toBe(422)
    const foreign = `${path}/states/${stateNamed(book, 'Cruise').id}/temperatures/${theirs.zone('Cabin').id}`
    expect((await client.send('PUT', foreign, { version: 1, celsius: 21 })).status).toBe(404)
  })

  it('set by two people at the same moment: exactly one wins', async () => {
    const book = await createWorkbook()
    const cell = `${book.path}/states/${stateNamed(book, 'Cruise').id}/temperatures/${book.zone('Cabin').id}`
    const answers = await Promise.all(
      [20, 21, 22].map((celsius) => book.client.send('PUT', cell, { version: 1, celsius })),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409])
  })
})
