import { describe, expect, it } from 'vitest'
import { LETTER_TYPES } from '#shared/thermometry/its90'
import { THERMOELEMENTS, legsOf, thermoelementInfo } from '#shared/thermometry/thermoelements'

describe('thermoelementInfo', () => {
  it.each([
    ['KP', -270, 1000],
    ['KN', -270, 1000],
    ['TN', -270, 1000],
    ['Cu', -270, 400],
    ['TP', -270, 400],
    ['JP', -210, 760],
    ['JN', -210, 760],
    ['NP', -270, 1000],
    ['NN', -270, 1000],
    ['RP', -50, 1000],
    ['SN', -50, 1000],
    ['BP', 0, 1000],
    ['BN', 0, 1000],
    ['brass', 0, 400],
    ['lead', 0, 300],
    ['tin', 0, 200],
    ['tin-lead-solder', 0, 100],
  ] as const)('%s holds from %d to %d °C', (id, lowCelsius, highCelsius) => {
    expect(thermoelementInfo(id)).toMatchObject({ id, lowCelsius, highCelsius })
  })

  it.each(THERMOELEMENTS)('%s has a symbol, a name, a source and a range that contains 0 °C', (id) => {
    const info = thermoelementInfo(id)
    expect(info.symbol).toMatch(/\S/)
    expect(info.name).toMatch(/\S/)
    expect(info.source).toMatch(/\S/)
    expect(info.lowCelsius).toBeLessThanOrEqual(0)
    expect(info.highCelsius).toBeGreaterThan(0)
  })

  it('tells symbols apart', () => {
    const symbols = THERMOELEMENTS.map((id) => thermoelementInfo(id).symbol)
    expect(new Set(symbols).size).toBe(THERMOELEMENTS.length)
  })

  it.each(LETTER_TYPES)('knows the legs of type %s', (type) => {
    const { positive, negative } = legsOf(type)
    expect(thermoelementInfo(positive).letter).toEqual({ type, leg: 'positive' })
    expect(thermoelementInfo(negative).letter).toEqual({ type, leg: 'negative' })
  })

  it('gives metals no letter type, and copper none of its own', () => {
    expect(thermoelementInfo('Cu').letter).toBeNull()
    expect(thermoelementInfo('brass').letter).toBeNull()
  })

  it('says which figures could not be verified', () => {
    const unverified = THERMOELEMENTS.filter((id) => !thermoelementInfo(id).verified)
    expect(unverified.filter((id) => thermoelementInfo(id).letter)).toEqual(['JP', 'JN', 'NP', 'NN'])
    expect(unverified).toContain('brass')
    expect(unverified).not.toContain('Cu')
  })

  it.each([
    ['JP', true],
    ['JN', false],
    ['KN', true],
    ['KP', false],
    ['Cu', false],
    ['iron', true],
    ['NN', undefined],
    ['stainless-steel-18-8', undefined],
  ] as const)('a magnet tells %s: %s', (id, magnetic) => {
    expect(thermoelementInfo(id).magnetic).toBe(magnetic)
  })
})
