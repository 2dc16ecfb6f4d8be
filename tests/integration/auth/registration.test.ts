import { beforeEach, describe, expect, it } from 'vitest'
import type { Account } from '#shared/types/account'
import { asOwner, madeAttempts } from '../support/database'
import { makeAccount, PASSWORD, send, sessionOf } from '../support/http'
import { resetDatabase } from '../support/reset'

beforeEach(() => resetDatabase())

const json = { email: '  Ada@Example.ORG ', displayName: ' Ada ', password: PASSWORD }
const register = (changes: object = {}) =>
  send<{ account: Account }>('POST', '/api/auth/register', { json: { ...json, ...changes } })

describe('registering', () => {
  it('makes an account and begins a session', async () => {
    const answer = await register()
    expect(answer.status).toBe(201)
    expect(answer.body).toEqual({
      account: {
        id: expect.any(Number),
        email: 'ada@example.org',
        displayName: 'Ada',
        preferences: { temperatureUnit: 'celsius', lengthUnit: 'metre', gaugeUnit: 'awg' },
      },
    })
    const own = await send('GET', '/api/account', { cookie: sessionOf(answer) })
    expect(own.body).toEqual(answer.body)
  })

  it('keeps the password as a salted hash only', async () => {
    await register()
    await register({ email: 'bea@example.org' })
    const [rows] = await asOwner((owner) => owner.query('SELECT password_hash AS hash FROM users'))
    const hashes = (rows as { hash: string }[]).map(({ hash }) => hash)
    expect(new Set(hashes).size).toBe(2)
    expect(hashes.every((hash) => hash.startsWith('$scrypt$'))).toBe(true)
  })

  it('refuses an e-mail address that has an account, however it is written', async () => {
    await register()
    const { status, body } = await send('POST', '/api/auth/register', {
      json: { ...json, email: 'ADA@example.org' },
    })
    expect(status).toBe(409)
    expect(body).toMatchObject({ code: 'conflict', errors: [{ field: 'email' }] })
  })

  it.each([
    [{ password: 'short' }, 'password'],
    [{ password: 'x'.repeat(201) }, 'password'],
    [{ email: 'ada' }, 'email'],
    [{ email: `${'a'.repeat(250)}@example.org` }, 'email'],
    [{ displayName: '   ' }, 'displayName'],
    [{ sessionVersion: 5 }, 'sessionVersion'],
  ])('refuses %o', async (changes, field) => {
    const { status, body } = await send('POST', '/api/auth/register', { json: { ...json, ...changes } })
    expect(status).toBe(422)
    expect(body.errors?.map((error) => error.field)).toEqual([field])
  })

  it('takes one of two who register the same address at once', async () => {
    const answers = await Promise.all([register(), register()])
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409])
  })

  it('is limited by address', async () => {
    await madeAttempts('register address 127.0.0.1', 60)
    const { status, headers, body } = await send('POST', '/api/auth/register', { json })
    expect(status).toBe(429)
    expect(body.code).toBe('rate-limited')
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(3500)
  })
})

describe('what registering leaves in the audit', () => {
  it('holds neither name nor address nor password', async () => {
    const { email } = await makeAccount('Very Recognisable')
    const [rows] = await asOwner((owner) => owner.query('SELECT * FROM audit_events'))
    expect(rows).toHaveLength(1)
    const text = JSON.stringify(rows)
    for (const secret of [email, 'Recognisable', PASSWORD, 'scrypt']) expect(text).not.toContain(secret)
  })
})
