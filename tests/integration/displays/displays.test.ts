import { beforeAll, describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { Display } from '#shared/types/workbook'
import { displayInput, runInput, thermocoupleInput } from '../../factories/records'
import { channelRows, createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

const withoutIds = ({ id: _id, version: _version, ...fields }: Display) => fields

describe('a display', () => {
  it('is added, changed and removed', async () => {
    const { client, path, zone } = await createWorkbook()
    const input = displayInput(zone('Panel').id, { notes: 'Left of the radio.' })
    const { display } = await client.must<{ display: Display }>('POST', `${path}/displays`, input)
    expect(display).toEqual({ ...input, id: display.id, version: 1 })

    const edit = { ...input, version: 1, name: 'Third gauge', inputs: 2, gainErrorFraction: 0.0125 }
    const { display: changed } = await client.must<{ display: Display }>(
      'PATCH',
      `${path}/displays/${display.id}`,
      edit,
    )
    expect(changed).toEqual({ ...edit, id: display.id, version: 2 })

    expect((await client.send('DELETE', `${path}/displays/${display.id}?version=2`)).status).toBe(204)
    const { displays } = await client.must<{ displays: Display[] }>('GET', `${path}/displays`)
    expect(displays.map(({ name }) => name)).toEqual(['Engine monitor'])
  })

  it.each<[Display['compensation']]>([
    [{ kind: 'internal', sensorOffsetKelvin: 1.5 }],
    [{ kind: 'remote-block', sensorOffsetKelvin: -0.25 }],
    [{ kind: 'fixed', celsius: 23.9 }],
    [{ kind: 'none' }],
    [{ kind: 'adds-degrees', sensorOffsetKelvin: 0 }],
    [{ kind: 'zeroed', ambientCelsius: 15 }],
  ])('keeps its compensation %j as it was entered', async (compensation) => {
    const { client, path, zone } = await createWorkbook()
    const input = displayInput(zone('Panel').id, { compensation })
    const { display } = await client.must<{ display: Display }>('POST', `${path}/displays`, input)
    expect(display.compensation).toEqual(compensation)
  })

  it('cannot have its terminals in a zone of another aircraft', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const { status, body } = await mine.client.send<Problem>(
      'POST',
      `${mine.path}/displays`,
      displayInput(theirs.zone('Panel').id),
    )
    expect(status).toBe(422)
    expect(body.errors).toMatchObject([{ field: 'terminalZoneId' }])
  })

  it('cannot bear the name of another', async () => {
    const { client, path, zone } = await createWorkbook()
    const { status, body } = await client.send<Problem>(
      'POST',
      `${path}/displays`,
      displayInput(zone('Panel').id, { name: 'Engine monitor' }),
    )
    expect([status, body.code]).toEqual([409, 'conflict'])
    expect(body.errors).toMatchObject([{ field: 'name' }])
  })

  it('cannot lose an input that is in use, nor go while it reads channels', async () => {
    const { client, path, display, zone } = await createWorkbook()
    await client.must(
      'POST',
      `${path}/channels`,
      thermocoupleInput(zone('Oil').id, { displayId: display.id, inputNumber: 8, typeSetting: 'K' }),
    )
    const edit = { ...withoutIds(display), version: display.version, inputs: 4 }
    const fewer = await client.send<Problem>('PATCH', `${path}/displays/${display.id}`, edit)
    expect([fewer.status, fewer.body.code]).toEqual([409, 'conflict'])
    expect(fewer.body.detail).toContain('TEMP 9')
    const removal = await client.send<Problem>(
      'DELETE',
      `${path}/displays/${display.id}?version=${display.version}`,
    )
    expect(removal.status).toBe(409)
    expect(removal.body.detail).toBe('"Engine monitor" reads EGT 1, EGT 2, CHT 1 and 3 more.')
  })

  it('moves the readings of its channels when its sensor is off', async () => {
    const { client, path, display, channel, zone } = await createWorkbook()
    await client.must('PUT', `${path}/channels/${channel('EGT 1').id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })
    await client.must('PATCH', `${path}/displays/${display.id}`, {
      ...withoutIds(display),
      version: display.version,
      compensation: { kind: 'internal', sensorOffsetKelvin: 3 },
    })
    const row = (await channelRows(client, path)).find((one) => one.channel.tag === 'EGT 1')
    expect(row).toMatchObject({ standing: 'faults', findingCodes: ['compensation-error'] })
    expect(row?.worstErrorKelvin).toBeGreaterThan(2.5)
    expect(row?.worstErrorKelvin).toBeLessThan(3.5)
  })

  it('is refused a stale edit, with what changed', async () => {
    const { client, path, display } = await createWorkbook()
    const edit = (inputs: number) =>
      client.send<Problem>('PATCH', `${path}/displays/${display.id}`, {
        ...withoutIds(display),
        version: display.version,
        inputs,
      })
    expect((await edit(12)).status).toBe(200)
    const { status, body } = await edit(16)
    expect([status, body.code]).toEqual([409, 'stale-version'])
    expect(body.changed).toMatchObject({ version: 2, fields: [{ field: 'inputs', current: 12 }] })
  })

  it('of another aircraft is not found', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const path = `${mine.path}/displays/${theirs.display.id}`
    const edit = { ...withoutIds(theirs.display), version: 1 }
    expect((await mine.client.send('PATCH', path, edit)).status).toBe(404)
    expect((await mine.client.send('DELETE', `${path}?version=1`)).status).toBe(404)
  })
})
