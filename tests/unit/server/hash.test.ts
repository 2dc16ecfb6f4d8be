import { describe, expect, it } from 'vitest'
import { canonicalJson, FIRST_PREVIOUS_HASH, hashEvent } from '~~/server/audit/hash'

const event = {
  chain: 'aircraft:1',
  sequence: 1,
  at: new Date('2026-01-02T03:04:05.678Z'),
  actorId: 2,
  action: 'zone.updated',
  entity: 'zone',
  entityId: 3,
  before: null,
  after: { name: 'Bay', celsius: 20.5 },
  previousHash: FIRST_PREVIOUS_HASH,
}

describe('canonical JSON', () => {
  it('is the same whatever the order of the keys', () => {
    expect(canonicalJson({ b: [{ d: 1, c: 2 }], a: null })).toBe('{"a":null,"b":[{"c":2,"d":1}]}')
    expect(canonicalJson({ a: null, b: [{ c: 2, d: 1 }] })).toBe(
      canonicalJson({ b: [{ d: 1, c: 2 }], a: null }),
    )
  })

  it('keeps the order of a list', () => {
    expect(canonicalJson([2, 1])).not.toBe(canonicalJson([1, 2]))
  })

  it('is the same before the database as after it', () => {
    const record = {
      at: event.at,
      gone: undefined,
      list: [undefined],
      minusZero: -0,
      number: 1e21,
      tiny: 1e-7,
    }
    expect(canonicalJson(JSON.parse(JSON.stringify(record)))).toBe(canonicalJson(record))
  })
})

describe('the hash of an event', () => {
  it('is 64 hexadecimal digits and does not change', () => {
    expect(hashEvent(event)).toMatch(/^[0-9a-f]{64}$/)
    expect(hashEvent({ ...event, after: { celsius: 20.5, name: 'Bay' } })).toBe(hashEvent(event))
  })

  it.each([
    ['chain', 'aircraft:2'],
    ['sequence', 2],
    ['at', new Date('2026-01-02T03:04:05.679Z')],
    ['actorId', null],
    ['action', 'zone.deleted'],
    ['entity', 'display'],
    ['entityId', 4],
    ['before', {}],
    ['after', { name: 'Bay', celsius: 20.6 }],
    ['previousHash', '1'.repeat(64)],
  ])('vouches for %s', (field, value) => {
    expect(hashEvent({ ...event, [field]: value })).not.toBe(hashEvent(event))
  })

  it('has nothing to say of the key of the row', () => {
    expect(hashEvent(Object.assign({}, event, { id: 9 }))).toBe(hashEvent(event))
  })
})
