import { describe, expect, it } from 'vitest'
import { layOutEngine } from '#shared/domain/engineLayout'
import { createAircraftSchema } from '#shared/schemas/aircraft'
import { logProbeSchema } from '#shared/schemas/probe'
import { wiringRunSchema } from '#shared/schemas/run'
import { DEMO_PROBES } from '~~/server/demo/data/probes'
import {
  DEMO_AIR_GAUGE,
  DEMO_AIRCRAFT,
  DEMO_TEMPERATURES,
  DEMO_TYPE_SETTINGS,
} from '~~/server/demo/data/project'
import { DEMO_RUNS } from '~~/server/demo/data/runs'

const { channels, zones, states } = layOutEngine(DEMO_AIRCRAFT.layout)
const thermocouples = channels.filter((channel) => channel.sensor === 'thermocouple').map(({ tag }) => tag)
const zoneNames = zones.map((zone) => zone.name)

describe('the demo project', () => {
  it('would be accepted by the form', () => {
    expect(createAircraftSchema.safeParse(DEMO_AIRCRAFT).error).toBeUndefined()
    for (const run of Object.values(DEMO_RUNS)) expect(wiringRunSchema.safeParse(run).error).toBeUndefined()
    for (const probe of Object.values(DEMO_PROBES))
      expect(
        logProbeSchema.safeParse({ ...probe, version: null, thermocoupleType: 'K' }).error,
      ).toBeUndefined()
  })

  it('has at least 14 channels, a probe and a run for every thermocouple and for nothing else', () => {
    expect(channels.length).toBeGreaterThanOrEqual(14)
    expect(Object.keys(DEMO_RUNS).sort()).toEqual([...thermocouples].sort())
    expect(Object.keys(DEMO_PROBES).sort()).toEqual([...thermocouples].sort())
  })

  it('names only zones, states and channels that its engine has', () => {
    for (const { joints } of Object.values(DEMO_RUNS))
      for (const { tipSideZone, displaySideZone } of joints)
        expect(zoneNames).toEqual(expect.arrayContaining([tipSideZone, displaySideZone]))
    for (const { state, zone } of DEMO_TEMPERATURES) {
      expect(zoneNames).toContain(zone)
      expect(states.map(({ name }) => name)).toContain(state)
    }
    for (const tag of [...DEMO_AIR_GAUGE.channels, ...DEMO_TYPE_SETTINGS.map((one) => one.tag)])
      expect(thermocouples).toContain(tag)
  })
})
