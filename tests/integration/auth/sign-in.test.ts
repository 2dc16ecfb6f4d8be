import { beforeEach, describe, expect, it } from 'vitest'
import { makeAccount, PASSWORD, send, sessionOf } from '../support/http'
import { resetDatabase } from '../support/reset'

beforeEach(() => resetDatabase())

const signIn = (email: string, password: string) =>
  send('POST', '/api/auth/sign-in', { json: { email, password } })

describe('signing in', () => {
  it('begins a session, whatever the case of the address', async () => {
    const { email, account } = await makeAccount()
    const answer = await signIn(email.toUpperCase(), PASSWORD)
    expect(answer.status).toBe(200)
    expect(answer.body).toEqual({ account })
    const own = await send('GET', '/api/account', { cookie: sessionOf(answer) })
    expect(own.status).toBe(200)
  })

  it('gives the same answer for a wrong password and an unknown address', async () => {
    const { email } = await makeAccount()
    const wrong = await signIn(email, 'not the password')
    const unknown = await signIn('nobody@test.cowlbook.invalid', PASSWORD)
    expect(wrong.status).toBe(401)
    expect(wrong.body.code).toBe('wrong-credentials')
    expect(unknown.status).toBe(wrong.status)
    expect(unknown.body).toEqual(wrong.body)
    expect(sessionOf(wrong)).toBeUndefined()
    expect(sessionOf(unknown)).toBeUndefined()
  })

  it('does not answer an unknown address at once', async () => {
    const { email } = await makeAccount()
    const time = async (address: string) => {
      const begin = performance.now()
      await signIn(address, 'not the password')
      return performance.now() - begin
    }
    await time('nobody@test.cowlbook.invalid')
    const known = Math.min(await time(email), await time(email), await time(email))
    const unknownAddress = 'nobody@test.cowlbook.invalid'
    const unknown = Math.min(
      await time(unknownAddress),
      await time(unknownAddress),
      await time(unknownAddress),
    )
    // Without the decoy the unknown address would be answered in a small fraction of the time.
    expect(unknown).toBeGreaterThan(known / 4)
  })
})

describe('the session cookie', () => {
  it('is out of reach of scripts and other sites, and ends', async () => {
    const { email } = await makeAccount()
    const [line = ''] = (await signIn(email, PASSWORD)).headers.getSetCookie()
    expect(line).toContain('HttpOnly')
    expect(line).toContain('SameSite=Lax')
    expect(line).toContain('Path=/')
    const expires = Date.parse(/Expires=([^;]+)/.exec(line)?.[1] ?? '')
    expect(expires - Date.now()).toBeLessThan(15 * 24 * 3600 * 1000)
  })

  it('is a new one at every sign-in, and its life begins anew', async () => {
    const { email, cookie } = await makeAccount()
    const json = { email, password: PASSWORD }
    const answer = await send('POST', '/api/auth/sign-in', { json, cookie })
    expect(sessionOf(answer)).toBeDefined()
    expect(sessionOf(answer)).not.toBe(cookie)
    expect(answer.headers.getSetCookie()).toHaveLength(1)
  })

  it.each([['cowlbook-session='], ['cowlbook-session=rubbish'], ['cowlbook-session=Fe26.2**a*b*c**d*e*f']])(
    'means nothing when it is not ours: %s',
    async (cookie) => {
      expect((await send('GET', '/api/account', { cookie })).status).toBe(401)
    },
  )

  it('is taken away at sign-out', async () => {
    const { cookie } = await makeAccount()
    const answer = await send('POST', '/api/auth/sign-out', { cookie })
    expect(answer.status).toBe(204)
    expect(sessionOf(answer)).toBe('cowlbook-session=')
    expect(answer.headers.getSetCookie()[0]).toContain('Max-Age=0')
  })
})
