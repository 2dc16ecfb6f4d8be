import { describe, expect, it } from 'vitest'
import {
  compensationWords,
  conductorWords,
  figureWords,
  jointKindWords,
  runNames,
} from '#shared/domain/findings'
import type { Compensation } from '#shared/thermometry/run'
import { COMPENSATION_KINDS, JOINT_KINDS } from '#shared/thermometry/run'
import { copperSplice } from '../../../fixtures/runs'

const { temperature, percent, length } = figureWords({ temperatureUnit: 'celsius', lengthUnit: 'metre' })

describe('runNames', () => {
  const { place } = runNames(copperSplice().run)

  it('does not say the kind of a joint twice', () => {
    expect(place({ kind: 'joint', jointId: 'plug' })).toBe('the plug pair')
    expect(place({ kind: 'joint', jointId: 'hot' })).toBe('the splice “Splice, engine bay”')
  })

  it('counts sections from the tip', () => {
    expect(place({ kind: 'section', sectionId: 'mend' })).toBe('section 3, “Mended length”')
    expect(place({ kind: 'section', sectionId: 'gone' })).toBe('a section')
  })

  it('names the ends', () => {
    expect([place({ kind: 'tip' }), place({ kind: 'terminals' }), place({ kind: 'display' })]).toEqual([
      'the tip',
      'the display terminals',
      'the display',
    ])
  })
})

describe('words', () => {
  it('give symbol and alloy for a leg, the metal alone for others', () => {
    expect(conductorWords('KN')).toBe('KN (nickel-aluminium)')
    expect(conductorWords('Cu')).toBe('copper')
    expect(conductorWords('brass')).toBe('brass')
  })

  it.each(JOINT_KINDS)('have a name for a %s', (kind) => {
    expect(jointKindWords(kind)).toMatch(/^[a-z -]+$/)
  })

  it('tell every kind of compensation apart', () => {
    const kinds: Record<Compensation['kind'], Compensation> = {
      internal: { kind: 'internal', sensorOffsetKelvin: 0 },
      'remote-block': { kind: 'remote-block', sensorOffsetKelvin: 0 },
      fixed: { kind: 'fixed', celsius: 25 },
      none: { kind: 'none' },
      'adds-degrees': { kind: 'adds-degrees', sensorOffsetKelvin: 0 },
      zeroed: { kind: 'zeroed', ambientCelsius: 18 },
    }
    const words = COMPENSATION_KINDS.map((kind) => compensationWords(kinds[kind], temperature))
    expect(new Set(words).size).toBe(COMPENSATION_KINDS.length)
    expect(words).toContain('Fixed compensation, 25.0\u00a0°C')
    expect(words).toContain('Zeroed at 18.0\u00a0°C')
  })

  it('keep a figure with its unit', () => {
    expect(percent(0.01)).toBe('+1.00\u00a0%')
    expect(length(1.2)).toBe('1.20\u00a0m')
  })
})
