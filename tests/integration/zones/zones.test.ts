import { beforeAll, describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { Zone, ZoneGrid } from '#shared/types/workbook'
import { displayInput, runInput, thermocoupleInput } from '../../factories/records'
import { createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

const nook = { name: 'Nook', kind: 'other', celsius: 33.5 } as const

describe('a zone', () => {
  it('is added with its temperature in every state, renamed and removed', async () => {
    const { client, path, grid } = await createWorkbook()
    const { zone } = await client.must<{ zone: Zone }>('POST', `${path}/zones`, nook)
    expect(zone).toMatchObject({ name: 'Nook', kind: 'other', position: grid.zones.length })
    const withIt = await client.must<ZoneGrid>('GET', `${path}/zones`)
    const temperatures = withIt.temperatures.filter((one) => one.zoneId === zone.id)
    expect(temperatures.map((one) => one.celsius)).toEqual(grid.states.map(() => 33.5))

    const { zone: renamed } = await client.must<{ zone: Zone }>('PATCH', `${path}/zones/${zone.id}`, {
      version: zone.version,
      name: 'Corner',
      kind: 'engine-bay',
    })
    expect(renamed).toMatchObject({ name: 'Corner', kind: 'engine-bay', version: zone.version + 1 })

    const removal = await client.send('DELETE', `${path}/zones/${zone.id}?version=${renamed.version}`)
    expect(removal.status).toBe(204)
    expect(await client.must('GET', `${path}/zones`)).toEqual(grid)
  })

  it('cannot bear the name of another one', async () => {
    const { client, path, zone } = await createWorkbook()
    const { status, body } = await client.send<Problem>('POST', `${path}/zones`, { ...nook, name: 'Cabin' })
    expect([status, body.code]).toEqual([409, 'conflict'])
    const renaming = await client.send<Problem>('PATCH', `${path}/zones/${zone('Panel').id}`, {
      version: zone('Panel').version,
      name: 'Cabin',
      kind: 'panel',
    })
    expect([renaming.status, renaming.body.code]).toEqual([409, 'conflict'])
    expect(renaming.body.detail).toContain('Cabin')
  })

  it('keeps its own name when only its kind changes', async () => {
    const { client, path, zone } = await createWorkbook()
    const { id, version, name } = zone('Panel')
    const { status } = await client.send('PATCH', `${path}/zones/${id}`, { version, name, kind: 'cabin' })
    expect(status).toBe(200)
  })

  it('cannot be removed while a tip, a joint or a display needs it, and says which', async () => {
    const { client, path, zone, channel } = await createWorkbook()
    const { zone: added } = await client.must<{ zone: Zone }>('POST', `${path}/zones`, nook)
    const refusal = async () => {
      const answer = await client.send<Problem>(
        'DELETE',
        `${path}/zones/${added.id}?version=${added.version}`,
      )
      expect([answer.status, answer.body.code]).toEqual([409, 'conflict'])
      return answer.body.detail
    }
    await client.must('POST', `${path}/channels`, thermocoupleInput(added.id))
    expect(await refusal()).toContain('TEMP 9')

    await client.must('PUT', `${path}/channels/${channel('CHT 2').id}/run`, {
      version: null,
      run: runInput(added.id),
    })
    expect(await refusal()).toContain('Plug pair of CHT 2')

    await client.must('POST', `${path}/displays`, displayInput(added.id))
    expect(await refusal()).toContain('Second gauge')
    expect(zone('Cabin')).toBeDefined()
  })

  it('is refused a stale edit, with what changed and by whom', async () => {
    const { client, path, zone } = await createWorkbook()
    const { id, version } = zone('Cabin')
    await client.must('PATCH', `${path}/zones/${id}`, { version, name: 'Cockpit', kind: 'cabin' })
    const { status, body } = await client.send<Problem>('PATCH', `${path}/zones/${id}`, {
      version,
      name: 'Saloon',
      kind: 'cabin',
    })
    expect(status).toBe(409)
    expect(body.changed).toMatchObject({
      version: version + 1,
      fields: [{ field: 'name', current: 'Cockpit' }],
    })
    const removal = await client.send<Problem>('DELETE', `${path}/zones/${id}?version=${version}`)
    expect([removal.status, removal.body.code]).toEqual([409, 'stale-version'])
  })

  it('of another aircraft is not found', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const { id, version } = theirs.zone('Cabin')
    const path = `${mine.path}/zones/${id}`
    const edit = await mine.client.send('PATCH', path, { version, name: 'X', kind: 'cabin' })
    const removal = await mine.client.send('DELETE', `${path}?version=${version}`)
    expect([edit.status, removal.status]).toEqual([404, 404])
  })
})
