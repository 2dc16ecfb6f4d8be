import { beforeEach, describe, expect, it } from 'vitest'
import { madeAttempts } from '../support/database'
import { makeAccount, PASSWORD, send, sessionOf } from '../support/http'
import { resetDatabase } from '../support/reset'

beforeEach(() => resetDatabase())

const NEW_PASSWORD = 'another password for tests'
const isSignedIn = async (cookie: string | undefined) =>
  (await send('GET', '/api/account', { cookie })).status === 200
const change = (cookie: string, currentPassword: string, newPassword = NEW_PASSWORD) =>
  send('POST', '/api/account/password', { cookie, json: { currentPassword, newPassword } })

describe('changing the password', () => {
  it('ends every session but the one that changed it', async () => {
    const { email, cookie } = await makeAccount()
    const elsewhere = sessionOf(
      await send('POST', '/api/auth/sign-in', { json: { email, password: PASSWORD } }),
    )
    expect(await isSignedIn(elsewhere)).toBe(true)

    const answer = await change(cookie, PASSWORD)
    expect(answer.status).toBe(204)
    expect(await isSignedIn(sessionOf(answer))).toBe(true)
    expect(await isSignedIn(elsewhere)).toBe(false)
    expect(await isSignedIn(cookie)).toBe(false)
  })

  it('takes the cookie of an ended session away', async () => {
    const { cookie } = await makeAccount()
    await change(cookie, PASSWORD)
    const answer = await send('GET', '/api/account', { cookie })
    expect(sessionOf(answer)).toBe('cowlbook-session=')
  })

  it('makes the new password the one that counts', async () => {
    const { email, cookie } = await makeAccount()
    await change(cookie, PASSWORD)
    const signIn = (password: string) => send('POST', '/api/auth/sign-in', { json: { email, password } })
    expect((await signIn(PASSWORD)).status).toBe(401)
    expect((await signIn(NEW_PASSWORD)).status).toBe(200)
  })

  it('needs the current password', async () => {
    const { cookie } = await makeAccount()
    const { status, body } = await change(cookie, 'not the password')
    expect(status).toBe(422)
    expect(body.errors).toEqual([{ field: 'currentPassword', reason: 'This is not your current password.' }])
    expect(await isSignedIn(cookie)).toBe(true)
  })

  it('can be tried ten times', async () => {
    const { account, cookie } = await makeAccount()
    await madeAttempts(`password account ${account.id}`, 9)
    expect((await change(cookie, 'not the password')).status).toBe(422)
    expect((await change(cookie, 'not the password')).status).toBe(429)
  })

  it('is done once when it is asked for twice at once', async () => {
    const { cookie } = await makeAccount()
    const answers = await Promise.all([change(cookie, PASSWORD), change(cookie, PASSWORD)])
    const statuses = answers.map(({ status }) => status).sort()
    expect(statuses[0]).toBe(204)
    expect([401, 409, 422]).toContain(statuses[1])
  })

  it.each([['short'], ['']])('wants a better one than "%s"', async (newPassword) => {
    const { cookie } = await makeAccount()
    const { status, body } = await change(cookie, PASSWORD, newPassword)
    expect(status).toBe(422)
    expect(body.errors?.[0]?.field).toBe('newPassword')
  })
})
