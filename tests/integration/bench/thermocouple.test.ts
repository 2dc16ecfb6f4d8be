import { describe, expect, it } from 'vitest'
import type { Problem } from '#shared/types/problem'
import type { ThermocoupleAnswer } from '#shared/types/bench'
import { send } from '../support/http'

const ask = (query: string) => send<ThermocoupleAnswer>('GET', `/api/bench/thermocouple?${query}`)
const refused = (query: string) => send<Problem>('GET', `/api/bench/thermocouple?${query}`)

describe('temperature to emf', () => {
  it('answers the published 12.209 mV for type K at 300 °C', async () => {
    const { status, body } = await ask('type=K&celsius=300')
    expect(status).toBe(200)
    expect(body.millivolts).toBeCloseTo(12.209, 3)
    expect(body.coldJunctionCelsius).toBe(0)
    expect(body.range).toEqual({ lowCelsius: -270, highCelsius: 1372 })
    expect(body.source).toContain('ITS-90')
  })

  it('takes away the emf of the cold junction', async () => {
    // Published table, type K: 300 °C 12.209 mV, 25 °C 1.000 mV.
    const { body } = await ask('type=K&celsius=300&coldJunctionCelsius=25')
    expect(body.millivolts).toBeCloseTo(12.209 - 1.0, 2)
  })

  it('gives −0.798 mV for a type K tip in ice and terminals at 20 °C', async () => {
    const { body } = await ask('type=K&celsius=0&coldJunctionCelsius=20')
    expect(body.millivolts).toBeCloseTo(-0.798, 3)
  })

  it('needs no session and sets no cookie', async () => {
    const { headers } = await ask('type=T&celsius=-40')
    expect(headers.getSetCookie()).toEqual([])
  })
})

describe('emf to temperature', () => {
  it('answers 300 °C for 12.209 mV of type K', async () => {
    const { status, body } = await ask('type=K&millivolts=12.209')
    expect(status).toBe(200)
    expect(Math.abs(body.celsius - 300)).toBeLessThan(0.02)
    expect(body.millivolts).toBe(12.209)
    expect(body.sensitivityMillivoltsPerKelvin).toBeCloseTo(0.0414, 3)
  })

  it('adds the emf of the cold junction, and comes back to where it started', async () => {
    const there = await ask('type=J&celsius=487.25&coldJunctionCelsius=31.5')
    const back = await ask(`type=J&millivolts=${there.body.millivolts}&coldJunctionCelsius=31.5`)
    expect(back.body.celsius).toBeCloseTo(487.25, 6)
  })
})

describe('what cannot be answered', () => {
  it.each([
    ['type=Q&celsius=1', 'type', 'type must be one of B, E, J, K, N, R, S, T.'],
    ['celsius=1', 'type', 'type must be one of B, E, J, K, N, R, S, T.'],
    ['type=K', 'celsius', 'Give either celsius or millivolts, not both.'],
    ['type=K&celsius=1&millivolts=1', 'millivolts', 'Give either celsius or millivolts, not both.'],
    ['type=K&celsius=12abc', 'celsius', 'celsius must be a number, such as 300 or -12.5.'],
    ['type=K&celsius=', 'celsius', 'celsius must be a number, such as 300 or -12.5.'],
    ['type=K&celsius=NaN', 'celsius', 'celsius must be a number, such as 300 or -12.5.'],
    ['type=K&celsius=1e400', 'celsius', 'celsius is too large.'],
    ['type=K&celsius=1&unit=F', 'unit', 'There is no field of this name.'],
  ])('%s', async (query, field, reason) => {
    const { status, headers, body } = await refused(query)
    expect(status).toBe(422)
    expect(headers.get('content-type')).toBe('application/problem+json')
    expect(body).toMatchObject({ status: 422, code: 'invalid-input' })
    expect(body.errors).toContainEqual({ field, reason })
  })

  it.each([
    ['type=K&celsius=1373', 'celsius', '-270 to 1372 °C'],
    ['type=K&celsius=20&coldJunctionCelsius=-300', 'coldJunctionCelsius', '-270 to 1372 °C'],
    ['type=K&millivolts=60', 'millivolts', 'mV'],
    ['type=B&millivolts=-0.001', 'millivolts', 'only a positive emf tells'],
  ])('%s lies out of range', async (query, field, part) => {
    const { status, body } = await refused(query)
    expect(status).toBe(422)
    expect(body.code).toBe('out-of-range')
    expect(body.errors).toEqual([{ field, reason: expect.stringContaining(part) }])
  })

  it('takes a parameter once', async () => {
    const { status, body } = await refused('type=K&celsius=1&celsius=2')
    expect(status).toBe(422)
    expect(body.errors?.[0]?.field).toBe('celsius')
  })
})
