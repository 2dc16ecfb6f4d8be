import { describe, expect, it } from 'vitest'
import { NotANumberError, OutOfRangeError, ThermometryError, requireWithin } from '#shared/thermometry/errors'

describe('requireWithin', () => {
  it.each([-270, 0, 1372])('lets %d through, both ends included', (value) => {
    expect(() => requireWithin('type K temperature', value, -270, 1372, '°C')).not.toThrow()
  })

  it.each([-270.001, 1372.001])('refuses %d and carries what was wrong', (value) => {
    const refuse = () => requireWithin('type K temperature', value, -270, 1372, '°C')
    expect(refuse).toThrow(OutOfRangeError)
    expect(refuse).toThrow(
      expect.objectContaining({
        code: 'out-of-range',
        name: 'OutOfRangeError',
        what: 'type K temperature',
        value,
        low: -270,
        high: 1372,
        unit: '°C',
      }),
    )
  })

  it('names the range in words and numbers', () => {
    expect(() => requireWithin('type K temperature', 1400, -270, 1372, '°C')).toThrow(
      'The type K temperature 1400 °C is outside its range, -270 to 1372 °C.',
    )
  })

  it.each([Number.NaN, Infinity, -Infinity])('refuses %d as no finite number', (value) => {
    const refuse = () => requireWithin('type K emf', value, 0, 1, 'mV')
    expect(refuse).toThrow(NotANumberError)
    expect(refuse).toThrow(expect.objectContaining({ code: 'not-a-number', what: 'type K emf' }))
    expect(refuse).toThrow('The type K emf must be a finite number.')
  })
})

describe('the errors', () => {
  it('are all of one kind, told apart by a code', () => {
    const errors = [new OutOfRangeError('emf', 1, 2, 3, 'mV'), new NotANumberError('emf')]
    for (const error of errors) expect(error).toBeInstanceOf(ThermometryError)
    expect(errors.map(({ code }) => code)).toEqual(['out-of-range', 'not-a-number'])
  })

  it('print a computed limit to 0.1 µV and add the reason', () => {
    const error = new OutOfRangeError(
      'type K emf',
      -6.458,
      -6.457737952738358,
      54.886364025304395,
      'mV',
      'So.',
    )
    expect(error.message).toBe('The type K emf -6.458 mV is outside its range, -6.4577 to 54.8864 mV. So.')
    expect(error.low).toBe(-6.457737952738358)
  })
})
