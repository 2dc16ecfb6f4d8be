import { describe, expect, it } from 'vitest'
import { legsOf, LETTER_TYPES, sameThermoelement, THERMOELEMENTS } from '#shared/thermometry'
import { heatStep } from '~/drawing/run/heat'
import { lineStyle } from '~/drawing/run/lineStyles'
import { partIdOf } from '~/drawing/run/partId'

describe('heatStep', () => {
  it.each([
    [-40, 0],
    [14.9, 0],
    [15, 1],
    [72, 3],
    [200, 4],
    [549, 5],
    [900, 6],
  ])('%d °C is step %d', (celsius, step) => {
    expect(heatStep(celsius)).toBe(step)
  })
})

describe('lineStyle', () => {
  it.each(LETTER_TYPES)('tells the two legs of type %s apart', (type) => {
    const { positive, negative } = legsOf(type)
    expect(lineStyle(positive)).not.toEqual(lineStyle(negative))
  })

  it('draws one alloy alike under all its names', () => {
    for (const one of THERMOELEMENTS)
      for (const other of THERMOELEMENTS)
        if (sameThermoelement(one, other)) expect(lineStyle(one)).toEqual(lineStyle(other))
  })

  it('tells copper from both legs of type K', () => {
    expect(new Set([lineStyle('Cu'), lineStyle('KP'), lineStyle('KN')]).size).toBe(3)
  })
})

describe('partIdOf', () => {
  it('names every place apart', () => {
    expect(partIdOf({ kind: 'section', sectionId: 'a' })).toBe('section:a')
    expect(partIdOf({ kind: 'joint', jointId: 'a' })).toBe('joint:a')
    expect(partIdOf({ kind: 'terminals' })).toBe('terminals')
    expect(partIdOf({ kind: 'tip' })).toBe('tip')
    expect(partIdOf({ kind: 'display' })).toBe('display')
  })
})
