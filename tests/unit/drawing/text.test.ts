import { describe, expect, it } from 'vitest'
import { textWidth, wrapText } from '~/drawing/text'

describe('textWidth', () => {
  it('grows with the text and with its size', () => {
    expect(textWidth('', 12)).toBe(0)
    expect(textWidth('KP', 24)).toBeCloseTo(2 * textWidth('KP', 12))
    expect(textWidth('will', 12)).toBeLessThan(textWidth('WIMM', 12))
  })
})

describe('wrapText', () => {
  it('breaks at spaces and keeps figures with their units', () => {
    expect(wrapText('Extension cable', 12, 70, 2)).toEqual(['Extension', 'cable'])
    expect(wrapText('at 200.0\u00a0°C', 12, 60, 2)).toEqual(['at', '200.0\u00a0°C'])
  })

  it('ends in an ellipsis where lines run out', () => {
    const lines = wrapText('Firewall feed-through, engine side, upper left', 12, 90, 2)
    expect(lines).toHaveLength(2)
    expect(lines[1]).toMatch(/…$/)
    expect(Math.max(...lines.map((line) => textWidth(line, 12)))).toBeLessThanOrEqual(90)
  })

  it('shortens a single word that is too long', () => {
    expect(wrapText('Thermoelektrizitätsanschluss', 12, 60, 2)[0]).toMatch(/^Ther.*…$/)
  })

  it('makes no line of nothing', () => {
    expect(wrapText('  ', 12, 60, 2)).toEqual([])
  })
})
