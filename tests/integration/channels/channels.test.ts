import { beforeAll, describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { Channel, ChannelSheet, ChannelTable } from '#shared/types/workbook'
import { probeInput, runInput, thermocoupleInput } from '../../factories/records'
import { channelRows, createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

/** What a form sends back: everything of the channel but what only the server gives. */
function edit({ id: _id, position: _position, ...fields }: Channel, changes: Partial<Channel> = {}) {
  return { ...fields, ...changes }
}

describe('a channel', () => {
  it('is added after the others, changed and removed with everything of it', async () => {
    const { client, path, zone, display } = await createWorkbook()
    const input = thermocoupleInput(zone('Oil').id, {
      displayId: display.id,
      inputNumber: 7,
      typeSetting: 'K',
      workingLowCelsius: -20,
      workingHighCelsius: 118.5,
    })
    const { channel } = await client.must<{ channel: Channel }>('POST', `${path}/channels`, input)
    expect(channel).toEqual({ ...input, id: channel.id, version: 1, position: 5 })
    await client.must('PUT', `${path}/channels/${channel.id}/probe`, probeInput())
    await client.must('PUT', `${path}/channels/${channel.id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })

    const { channel: changed } = await client.must<{ channel: Channel }>(
      'PATCH',
      `${path}/channels/${channel.id}`,
      edit(channel, { tag: 'SUMP', notes: 'At the drain plug.' }),
    )
    expect(changed).toEqual({ ...channel, tag: 'SUMP', notes: 'At the drain plug.', version: 2 })

    expect((await client.send('DELETE', `${path}/channels/${channel.id}?version=2`)).status).toBe(204)
    expect((await client.get(`${path}/channels/${channel.id}`)).status).toBe(404)
    expect(await channelRows(client, path)).toHaveLength(5)
  })

  it('cannot bear the tag of another', async () => {
    const { client, path, zone, channel } = await createWorkbook()
    const added = await client.send<Problem>(
      'POST',
      `${path}/channels`,
      thermocoupleInput(zone('Oil').id, { tag: 'EGT 2' }),
    )
    const renamed = await client.send<Problem>(
      'PATCH',
      `${path}/channels/${channel('EGT 1').id}`,
      edit(channel('EGT 1'), { tag: 'EGT 2' }),
    )
    for (const { status, body } of [added, renamed]) {
      expect([status, body.code]).toEqual([409, 'conflict'])
      expect(body.errors).toEqual([{ field: 'tag', reason: 'There is a channel tagged "EGT 2" already.' }])
    }
  })

  it('cannot take an input that another channel is on, and says which one it is', async () => {
    const { client, path, display, channel } = await createWorkbook()
    const { status, body } = await client.send<Problem>(
      'PATCH',
      `${path}/channels/${channel('EGT 1').id}`,
      edit(channel('EGT 1'), { inputNumber: 2 }),
    )
    expect([status, body.code]).toEqual([409, 'conflict'])
    expect(body.detail).toBe(`Input 2 of "${display.name}" is taken by EGT 2.`)
    const beyond = await client.send<Problem>(
      'PATCH',
      `${path}/channels/${channel('EGT 1').id}`,
      edit(channel('EGT 1'), { inputNumber: 64 }),
    )
    expect(beyond.status).toBe(422)
    expect(beyond.body.errors).toEqual([
      { field: 'inputNumber', reason: '"Engine monitor" has inputs 1 to 8.' },
    ])
  })

  it('cannot name a zone or a display of another aircraft', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const egt = mine.channel('EGT 1')
    const foreign = (changes: Partial<Channel>) =>
      mine.client.send<Problem>('PATCH', `${mine.path}/channels/${egt.id}`, edit(egt, changes))
    const zone = await foreign({ tipZoneId: theirs.zone('Oil').id })
    expect([zone.status, zone.body.errors?.[0]?.field]).toEqual([422, 'tipZoneId'])
    const display = await foreign({ displayId: theirs.display.id })
    expect([display.status, display.body.errors?.[0]?.field]).toEqual([422, 'displayId'])
  })

  it('of another aircraft is not found, whatever is asked of it', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const foreign = theirs.channel('EGT 1')
    const path = `${mine.path}/channels/${foreign.id}`
    const answers = await Promise.all([
      mine.client.get(path),
      mine.client.send('PATCH', path, edit(foreign)),
      mine.client.send('DELETE', `${path}?version=1`),
      mine.client.send('PUT', `${path}/probe`, probeInput()),
      mine.client.send('DELETE', `${path}/probe?version=1`),
      mine.client.send('PUT', `${path}/run`, {
        version: null,
        run: runInput(mine.zone('Engine bay').id),
      }),
      mine.client.send('DELETE', `${path}/run?version=1`),
    ])
    expect(answers.map(({ status }) => status)).toEqual(Array(7).fill(404))
  })

  it('moves its readings with its type setting, and loses them with its display', async () => {
    const { client, path, channel, zone } = await createWorkbook()
    const { id } = channel('CHT 1')
    await client.must('PUT', `${path}/channels/${id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })
    const rowOf = async () => (await channelRows(client, path)).find((row) => row.channel.id === id)
    expect(await rowOf()).toMatchObject({ standing: 'as-intended', findingCodes: [] })

    await client.must('PATCH', `${path}/channels/${id}`, edit(channel('CHT 1'), { typeSetting: 'J' }))
    expect(await rowOf()).toMatchObject({ standing: 'faults', findingCodes: ['display-type-mismatch'] })

    const adrift = { version: 2, displayId: null, inputNumber: null, typeSetting: null }
    await client.must('PATCH', `${path}/channels/${id}`, edit(channel('CHT 1'), adrift))
    expect(await rowOf()).toMatchObject({ standing: 'no-display', readings: [], displayName: null })
  })

  it('changed by two people at the same moment: exactly one wins', async () => {
    const { client, path, channel } = await createWorkbook()
    const egt = channel('EGT 1')
    const answers = await Promise.all(
      ['one', 'two', 'three'].map((notes) =>
        client.send<Problem>('PATCH', `${path}/channels/${egt.id}`, edit(egt, { notes })),
      ),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409])
    const refused = answers.find(({ status }) => status === 409)?.body
    expect(refused).toMatchObject({ code: 'stale-version', changed: { version: 2 } })
    expect(refused?.changed?.fields.map(({ field }) => field)).toEqual(['notes'])
  })
})

describe('the channel table and sheet', () => {
  it('come in pages and in order', async () => {
    const { client, path } = await createWorkbook()
    const { rows } = await client.must<ChannelTable>('GET', `${path}/channels?page=2&pageSize=2`)
    expect(rows).toMatchObject({ total: 5, page: 2, pageSize: 2 })
    expect(rows.items.map(({ channel }) => channel.tag)).toEqual(['CHT 1', 'CHT 2'])
    expect((await client.get(`${path}/channels?pageSize=201`)).status).toBe(422)
    expect((await client.get(`${path}/channels?page=0`)).status).toBe(422)
  })

  it('lead from one channel to the next', async () => {
    const { client, path, channel, aircraft, display, grid } = await createWorkbook()
    const sheet = await client.must<ChannelSheet>('GET', `${path}/channels/${channel('EGT 2').id}`)
    expect(sheet).toEqual({
      aircraft,
      roles: sheet.roles,
      channel: channel('EGT 2'),
      probe: null,
      run: null,
      display,
      grid,
      readings: [],
      standing: 'planned',
      previous: { id: channel('EGT 1').id, tag: 'EGT 1' },
      next: { id: channel('CHT 1').id, tag: 'CHT 1' },
    })
    const first = await client.must<ChannelSheet>('GET', `${path}/channels/${channel('EGT 1').id}`)
    expect(first.previous).toBeNull()
  })
})
