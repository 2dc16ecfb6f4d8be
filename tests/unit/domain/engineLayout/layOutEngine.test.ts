import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { EngineLayoutError, layOutEngine, SUGGESTED_TEMPERATURES_SOURCE } from '#shared/domain/engineLayout'
import type { EngineLayout, Quantity } from '#shared/schemas/aircraft'
import { COOLINGS, engineLayoutSchema, IGNITIONS, QUANTITIES } from '#shared/schemas/aircraft'

function layout(changes: Partial<EngineLayout> = {}): EngineLayout {
  return {
    cylinders: 4,
    cooling: 'air',
    ignition: 'two-magnetos',
    quantities: ['exhaust-gas-temperature', 'cylinder-head-temperature', 'oil-temperature', 'engine-speed'],
    ...changes,
  }
}

const anyLayout: fc.Arbitrary<EngineLayout> = fc
  .record({
    cylinders: fc.integer({ min: 1, max: 12 }),
    cooling: fc.constantFrom(...COOLINGS),
    ignition: fc.constantFrom(...IGNITIONS),
    quantities: fc.subarray([...QUANTITIES], { minLength: 1 }),
  })
  .filter((made) => made.cooling === 'liquid' || !made.quantities.includes('coolant-temperature'))

const tags = (made: EngineLayout) => layOutEngine(made).channels.map((channel) => channel.tag)

describe('channels of a layout', () => {
  it('are named in the words of the trade, in the order of a panel', () => {
    expect(tags(layout())).toEqual([
      'EGT 1',
      'EGT 2',
      'EGT 3',
      'EGT 4',
      'CHT 1',
      'CHT 2',
      'CHT 3',
      'CHT 4',
      'OIL T',
      'RPM L',
      'RPM R',
    ])
  })

  it('stand in the same order however the quantities were asked for', () => {
    const asked = layout().quantities
    expect(tags(layout({ quantities: [...asked].reverse() }))).toEqual(tags(layout()))
  })

  it('has one engine speed for each source of ignition signal', () => {
    const speeds = (ignition: EngineLayout['ignition']) =>
      tags(layout({ ignition, quantities: ['engine-speed'] }))
    expect(speeds('two-magnetos')).toEqual(['RPM L', 'RPM R'])
    expect(speeds('magneto-and-electronic')).toEqual(['RPM MAG', 'RPM EI'])
    expect(speeds('two-electronic')).toEqual(['RPM A', 'RPM B'])
  })

  it('puts the tip of every cylinder into the zone of that cylinder', () => {
    const made = layOutEngine(layout({ cylinders: 6 }))
    const nameOf = (key: string | null) => made.zones.find((zone) => zone.key === key)?.name
    const tipOf = (tag: string) =>
      nameOf(made.channels.find((channel) => channel.tag === tag)?.tipZone ?? null)
    expect(tipOf('EGT 6')).toBe('Exhaust 6')
    expect(tipOf('CHT 2')).toBe('Cylinder head 2')
  })

  it('serves a single cylinder too', () => {
    expect(tags(layout({ cylinders: 1, quantities: ['exhaust-gas-temperature'] }))).toEqual(['EGT 1'])
  })

  it.each<[Quantity, string, string]>([
    ['oil-pressure', 'OIL P', 'voltage-transmitter'],
    ['fuel-pressure', 'FUEL P', 'voltage-transmitter'],
    ['fuel-flow', 'FUEL FLOW', 'pulse'],
    ['manifold-pressure', 'MAP', 'voltage-transmitter'],
    ['bus-voltage', 'BUS V', 'direct'],
    ['alternator-current', 'ALT A', 'direct'],
    ['intake-air-temperature', 'INTAKE AIR', 'thermocouple'],
    ['outside-air-temperature', 'OAT', 'thermocouple'],
  ])('measures %s as %s by %s', (quantity, tag, sensor) => {
    expect(layOutEngine(layout({ quantities: [quantity] })).channels).toMatchObject([{ tag, sensor }])
  })
})

describe('cooling', () => {
  it('gives a liquid-cooled engine a coolant zone and cooler heads', () => {
    const air = layOutEngine(layout())
    const liquid = layOutEngine(layout({ cooling: 'liquid', quantities: ['coolant-temperature'] }))
    expect(air.zones.some((zone) => zone.kind === 'coolant')).toBe(false)
    expect(liquid.channels).toMatchObject([{ tag: 'COOLANT T', tipZone: 'coolant' }])
    const climbHead = (made: typeof air) =>
      made.states.find((state) => state.name === 'Climb')?.zoneCelsius['cylinder-head-1'] ?? NaN
    expect(climbHead(liquid)).toBeLessThan(climbHead(air))
  })

  it('refuses coolant on an air-cooled engine, in the form as in the lay-out', () => {
    const asked = layout({ quantities: ['coolant-temperature'] })
    expect(() => layOutEngine(asked)).toThrow(EngineLayoutError)
    const checked = engineLayoutSchema.safeParse(asked)
    expect(checked.error?.issues).toMatchObject([
      { path: ['quantities'], message: 'An air-cooled engine has no coolant to measure.' },
    ])
  })
})

describe('suggested temperatures', () => {
  it('say that they have no source', () => {
    expect(SUGGESTED_TEMPERATURES_SOURCE).toBe('common practice, no source')
  })

  it('put the terminals a few kelvin above the panel in every state', () => {
    for (const { zoneCelsius } of layOutEngine(layout()).states) {
      const above = (zoneCelsius.terminals ?? NaN) - (zoneCelsius.panel ?? NaN)
      expect(above).toBeGreaterThanOrEqual(2)
      expect(above).toBeLessThanOrEqual(6)
    }
  })

  it('make the engine bay hottest in heat soak, and leave nothing warm in the hangar', () => {
    const { states } = layOutEngine(layout())
    const bay = (name: string) =>
      states.find((state) => state.name === name)?.zoneCelsius['engine-bay'] ?? NaN
    expect(states.map((state) => state.name)).toEqual([
      'Hangar',
      'Cold start',
      'Ground idle',
      'Climb',
      'Cruise',
      'Heat soak',
    ])
    expect(Math.max(...states.map((state) => bay(state.name)))).toBe(bay('Heat soak'))
    const { terminals: _terminals, ...hangar } = states[0]?.zoneCelsius ?? {}
    expect(new Set(Object.values(hangar)).size).toBe(1)
  })
})

describe('any layout', () => {
  it('has unique tags, zone keys, zone names and state names', () => {
    fc.assert(
      fc.property(anyLayout, (asked) => {
        const { channels, zones, states } = layOutEngine(asked)
        for (const names of [
          channels.map((channel) => channel.tag),
          zones.map((zone) => zone.key),
          zones.map((zone) => zone.name),
          states.map((state) => state.name),
        ])
          expect(new Set(names).size).toBe(names.length)
      }),
    )
  })

  it('has the zone of every tip and of the terminals, and its temperature in every state', () => {
    fc.assert(
      fc.property(anyLayout, (asked) => {
        const { channels, zones, states, display } = layOutEngine(asked)
        const keys = zones.map((zone) => zone.key)
        expect(keys).toContain(display.terminalZone)
        for (const { tipZone } of channels) if (tipZone !== null) expect(keys).toContain(tipZone)
        for (const { zoneCelsius } of states) {
          expect(Object.keys(zoneCelsius).sort()).toEqual([...keys].sort())
          expect(Object.values(zoneCelsius).every(Number.isFinite)).toBe(true)
        }
      }),
    )
  })

  it('numbers the inputs in sequence on a display that has them all', () => {
    fc.assert(
      fc.property(anyLayout, (asked) => {
        const { channels, display } = layOutEngine(asked)
        expect(channels.map((channel) => channel.inputNumber)).toEqual(channels.map((_, index) => index + 1))
        expect(display.inputs).toBeGreaterThanOrEqual(channels.length)
        expect(display.inputs).toBeLessThanOrEqual(64)
      }),
    )
  })

  it('gives a type and a tip zone to thermocouples and to nothing else', () => {
    fc.assert(
      fc.property(anyLayout, (asked) => {
        for (const channel of layOutEngine(asked).channels) {
          const isThermocouple = channel.sensor === 'thermocouple'
          expect(channel.thermocoupleType !== null).toBe(isThermocouple)
          expect(channel.tipZone !== null).toBe(isThermocouple)
        }
      }),
    )
  })
})
