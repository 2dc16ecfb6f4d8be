import { beforeAll, describe, expect, it } from 'vitest'
import { solveChannel } from '#shared/domain/channelRun'
import type { WiringRunInput } from '#shared/schemas/run'
import type { Problem } from '#shared/types/problem'
import type { ChannelSheet, ExpectedReading, WiringRun } from '#shared/types/workbook'
import { runInput } from '../../factories/records'
import { createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

beforeAll(() => resetDatabase())

interface RunAnswer {
  run: WiringRun
  readings: ExpectedReading[]
}

function everyField(zoneIds: [number, number]): WiringRunInput {
  const [probe, extension] = runInput(zoneIds[0]).sections
  const [plug] = runInput(zoneIds[0]).joints
  if (!probe || !extension || !plug) throw new Error('the factory makes two sections and a joint')
  return {
    sections: [probe, { ...extension, lengthMetres: null, gaugeAwg: null, positive: 'Cu' }],
    joints: [
      {
        ...plug,
        kind: 'feed-through',
        displaySideZone: String(zoneIds[1]),
        crossed: true,
        positiveMetal: 'KP',
        negativeMetal: 'KN',
        positiveOffsetKelvin: 1.25,
        negativeOffsetKelvin: -0.5,
      },
    ],
    terminals: { crossed: true, positiveOffsetKelvin: 0.125, negativeOffsetKelvin: 0 },
  }
}

describe('a wiring run', () => {
  it('is kept exactly as it was logged', async () => {
    const { client, path, channel, zone } = await createWorkbook()
    const at = `${path}/channels/${channel('EGT 1').id}`
    const input = everyField([zone('Firewall, engine side').id, zone('Cabin').id])
    const { run } = await client.must<RunAnswer>('PUT', `${at}/run`, { version: null, run: input })
    expect(run).toMatchObject({ ...input, version: 1, channelId: channel('EGT 1').id })
    expect((await client.must<ChannelSheet>('GET', at)).run).toEqual(run)
  })

  it('is saved anew with other parts, and removed with its readings', async () => {
    const { client, path, channel, zone, grid } = await createWorkbook()
    const at = `${path}/channels/${channel('EGT 1').id}`
    const bay = zone('Engine bay').id
    const first = await client.must<RunAnswer>('PUT', `${at}/run`, { version: null, run: runInput(bay) })
    expect(first.readings.map((reading) => reading.stateId)).toEqual(grid.states.map((state) => state.id))

    const [probe] = runInput(bay).sections
    const short = { ...runInput(bay), sections: [probe], joints: [] }
    const second = await client.must<RunAnswer>('PUT', `${at}/run`, { version: 1, run: short })
    expect(second.run).toMatchObject({ version: 2, id: first.run.id, joints: [] })
    expect(second.run.sections).toHaveLength(1)

    expect((await client.send('DELETE', `${at}/run?version=2`)).status).toBe(204)
    expect(await client.must<ChannelSheet>('GET', at)).toMatchObject({ run: null, readings: [] })
  })

  it('answers with what a fresh solve of the stored records gives', async () => {
    const { client, path, channel, zone } = await createWorkbook()
    const at = `${path}/channels/${channel('CHT 1').id}`
    const copper = runInput(zone('Engine bay').id, { positive: 'Cu', negative: 'Cu' })
    const { readings } = await client.must<RunAnswer>('PUT', `${at}/run`, { version: null, run: copper })
    const sheet = await client.must<ChannelSheet>('GET', at)
    expect(sheet.readings).toEqual(readings)
    const fresh = solveChannel(sheet.channel, sheet.display, sheet.run, sheet.grid)
    expect(fresh?.states).toHaveLength(readings.length)
    for (const { id, solution } of fresh?.states ?? []) {
      const stored = readings.find((reading) => reading.stateId === Number(id))
      expect(stored?.tipCelsius).toBeCloseTo(solution.tipCelsius, 3)
      expect(stored?.terminalMillivolts).toBeCloseTo(solution.terminalMillivolts ?? NaN, 5)
      expect(stored?.errorKelvin).toBeCloseTo(solution.errorKelvin ?? NaN, 3)
      expect(stored?.indication.kind).toBe(solution.indication.kind)
      expect(stored?.findingCodes).toEqual([...new Set(solution.findings.map(({ code }) => code))])
    }
  })

  it('stores an answer off the scale as such', async () => {
    const { client, path, channel, zone, display } = await createWorkbook()
    const { id: _id, version, ...fields } = display
    await client.must('PATCH', `${path}/displays/${display.id}`, { ...fields, version, highCelsius: 400 })
    const { readings } = await client.must<RunAnswer>('PUT', `${path}/channels/${channel('EGT 1').id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })
    const hot = readings.filter((reading) => reading.tipCelsius > 400)
    expect(hot.length).toBeGreaterThan(0)
    for (const reading of hot)
      expect(reading).toMatchObject({
        indication: { kind: 'off-scale-high', limitCelsius: 400 },
        errorKelvin: null,
        findingCodes: ['off-scale'],
      })
  })

  it('stores that an answer is withheld where no data reach', async () => {
    const { client, path, channel, zone, grid } = await createWorkbook()
    const [state] = grid.states
    await client.must('PUT', `${path}/channels/${channel('EGT 1').id}/run`, {
      version: null,
      run: runInput(zone('Engine bay').id),
    })
    await client.must('PUT', `${path}/states/${state?.id}/temperatures/${zone('Exhaust 1').id}`, {
      version: 1,
      celsius: 2500,
    })
    const { readings } = await client.must<ChannelSheet>('GET', `${path}/channels/${channel('EGT 1').id}`)
    const withheld = readings.find((reading) => reading.stateId === state?.id)
    expect(withheld).toMatchObject({
      tipCelsius: 2500,
      indication: { kind: 'withheld' },
      terminalMillivolts: null,
      errorKelvin: null,
    })
    expect(withheld?.findingCodes).toContain('tip-outside-type-range')
  })

  it('cannot pass a zone of another aircraft, and says at which joint', async () => {
    const [mine, theirs] = [await createWorkbook(), await createWorkbook()]
    const { status, body } = await mine.client.send<Problem>(
      'PUT',
      `${mine.path}/channels/${mine.channel('EGT 1').id}/run`,
      { version: null, run: runInput(theirs.zone('Engine bay').id) },
    )
    expect(status).toBe(422)
    expect(body.errors?.map(({ field }) => field)).toEqual([
      'run.joints.0.tipSideZone',
      'run.joints.0.displaySideZone',
    ])
  })

  it('saved by two people at the same moment: exactly one wins, first and later', async () => {
    const { client, path, channel, zone } = await createWorkbook()
    const at = `${path}/channels/${channel('EGT 1').id}/run`
    for (const version of [null, 1]) {
      const answers = await Promise.all(
        ['one', 'two', 'three'].map((label) =>
          client.send<Problem>('PUT', at, {
            version,
            run: runInput(zone('Engine bay').id, { label: `${label}, from ${version}` }),
          }),
        ),
      )
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409])
      const refused = answers.find(({ status }) => status === 409)?.body
      expect(refused?.code).toBe('stale-version')
      expect(refused?.changed?.fields.map(({ field }) => field)).toContain('sections')
    }
  })
})
