import { beforeAll, describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { ChannelSheet, Probe } from '#shared/types/workbook'
import { probeInput } from '../../factories/records'
import { createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

describe('a probe', () => {
  it('is logged, logged anew and removed', async () => {
    const { client, path, channel } = await createWorkbook()
    const at = `${path}/channels/${channel('EGT 1').id}`
    const { version: _none, ...fields } = probeInput({ leadLengthMetres: 0.875 })
    const { probe } = await client.must<{ probe: Probe }>('PUT', `${at}/probe`, {
      ...fields,
      version: null,
    })
    expect(probe).toMatchObject({ ...fields, version: 1, channelId: channel('EGT 1').id })
    expect(Date.parse(probe.loggedAt)).not.toBeNaN()
    expect(await client.must<ChannelSheet>('GET', at)).toMatchObject({ probe, standing: 'no-run' })

    const { probe: other } = await client.must<{ probe: Probe }>('PUT', `${at}/probe`, {
      ...fields,
      marking: 'P-002',
      version: 1,
    })
    expect(other).toMatchObject({ marking: 'P-002', version: 2, id: probe.id })

    expect((await client.send('DELETE', `${at}/probe?version=2`)).status).toBe(204)
    expect((await client.send('DELETE', `${at}/probe?version=2`)).status).toBe(404)
    expect(await client.must<ChannelSheet>('GET', at)).toMatchObject({ probe: null, standing: 'planned' })
  })

  it('is refused to whoever did not see the one before, even after it was removed', async () => {
    const { client, path, channel } = await createWorkbook()
    const at = `${path}/channels/${channel('EGT 1').id}/probe`
    await client.must('PUT', at, probeInput())
    const blind = await client.send<Problem>('PUT', at, probeInput({ marking: 'P-002' }))
    expect([blind.status, blind.body.code]).toEqual([409, 'stale-version'])
    expect(blind.body.changed?.fields).toContainEqual({ field: 'marking', current: 'P-001' })

    await client.must('DELETE', `${at}?version=1`)
    await client.must('PUT', at, probeInput({ marking: 'P-003' }))
    const old = await client.send<Problem>('PUT', at, probeInput({ marking: 'P-004', version: 1 }))
    expect(old.status).toBe(409)
    expect(old.body.changed?.fields).toContainEqual({ field: 'marking', current: 'P-003' })
  })

  it('has a type on a thermocouple channel, and only there', async () => {
    const { client, path, channel } = await createWorkbook()
    const log = (tag: string, thermocoupleType: 'K' | null) =>
      client.send<Problem>(
        'PUT',
        `${path}/channels/${channel(tag).id}/probe`,
        probeInput({ thermocoupleType }),
      )
    for (const refused of [await log('EGT 1', null), await log('OIL P', 'K')]) {
      expect(refused.status).toBe(422)
      expect(refused.body.errors).toMatchObject([{ field: 'thermocoupleType' }])
    }
    expect((await log('OIL P', null)).status).toBe(200)
  })
})
