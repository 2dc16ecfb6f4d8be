import { beforeEach, describe, expect, it } from 'vitest'
import { takeAttempt } from '~~/server/auth/rateLimit'
import { asOwner, madeAttempts, useTestDatabase } from '../support/database'
import { makeAccount, PASSWORD, send } from '../support/http'
import { resetDatabase } from '../support/reset'

useTestDatabase()
beforeEach(() => resetDatabase())

const signIn = (email: string, password: string) =>
  send('POST', '/api/auth/sign-in', { json: { email, password } })

const stored = async () => {
  const [rows] = await asOwner((owner) => owner.query('SELECT id FROM sign_in_attempts'))
  return (rows as object[]).length
}

describe('guessing at an account', () => {
  const nobody = 'nobody@test.cowlbook.invalid'

  it('ends after ten wrong passwords, for the right one too, and says when to come back', async () => {
    const { email } = await makeAccount()
    await madeAttempts(`sign-in account ${email}`, 8)
    const answers = await Promise.all(Array.from({ length: 4 }, () => signIn(email, 'wrong password')))
    expect(answers.map(({ status }) => status).sort()).toEqual([401, 401, 429, 429])
    const { status, headers, body } = await signIn(email, PASSWORD)
    expect(status).toBe(429)
    expect(body).toMatchObject({ code: 'rate-limited', status: 429 })
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(600)
    expect(Number(headers.get('retry-after'))).toBeLessThanOrEqual(900)
  })

  it('is limited for an address without an account in the same way', async () => {
    await madeAttempts(`sign-in account ${nobody}`, 9)
    expect((await signIn(nobody, 'wrong password')).status).toBe(401)
    expect((await signIn(nobody, 'wrong password')).status).toBe(429)
  })

  it('does not shut out other accounts', async () => {
    const { email } = await makeAccount()
    await madeAttempts(`sign-in account ${nobody}`, 10)
    expect((await signIn(email, PASSWORD)).status).toBe(200)
  })

  it('is limited by address, whatever the accounts', async () => {
    const { email } = await makeAccount()
    await madeAttempts('sign-in address 127.0.0.1', 50)
    expect((await signIn(email, PASSWORD)).status).toBe(429)
  })

  it('is not what signing in often is', async () => {
    const { email } = await makeAccount()
    await madeAttempts(`sign-in account ${email}`, 9)
    for (let i = 0; i < 3; i++) expect((await signIn(email, PASSWORD)).status).toBe(200)
  })

  it('can go on when the window has passed', async () => {
    const { email } = await makeAccount()
    await madeAttempts(`sign-in account ${email}`, 10)
    await asOwner((owner) => owner.query('UPDATE sign_in_attempts SET at = at - INTERVAL 16 MINUTE'))
    expect((await signIn(email, PASSWORD)).status).toBe(200)
  })
})

describe('attempts', () => {
  const limit = { subject: 'test', attempts: 3, windowSeconds: 60 }

  it('let no more than the limit through, however many come at once', async () => {
    const results = await Promise.allSettled(Array.from({ length: 20 }, () => takeAttempt([limit])))
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(3)
  })

  it('that were refused do not count, and leave nothing of the other limits behind', async () => {
    for (let i = 0; i < 3; i++) await takeAttempt([limit])
    const wide = { subject: 'wide', attempts: 100, windowSeconds: 60 }
    await expect(takeAttempt([wide, limit])).rejects.toMatchObject({ code: 'rate-limited' })
    expect(await stored()).toBe(3)
  })

  it('are forgotten when they succeed, and when they are old', async () => {
    const attempt = await takeAttempt([limit])
    await attempt.forget()
    expect(await stored()).toBe(0)
    await takeAttempt([limit])
    await asOwner((owner) => owner.query('UPDATE sign_in_attempts SET at = at - INTERVAL 2 DAY'))
    await takeAttempt([limit])
    expect(await stored()).toBe(1)
  })

  it('tell nobody who tried', async () => {
    await signIn('somebody@test.cowlbook.invalid', 'wrong password')
    const [rows] = await asOwner((owner) => owner.query('SELECT * FROM sign_in_attempts'))
    expect(JSON.stringify(rows)).not.toMatch(/somebody|127\.0\.0\.1/)
  })
})
