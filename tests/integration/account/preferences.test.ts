import { beforeEach, describe, expect, it } from 'vitest'
import { accountChain, verifyAuditChain } from '~~/server/audit'
import { database } from '~~/server/db/client'
import { asOwner, useTestDatabase } from '../support/database'
import { makeAccount, send } from '../support/http'
import { resetDatabase } from '../support/reset'

useTestDatabase()
beforeEach(() => resetDatabase())

const preferences = { temperatureUnit: 'fahrenheit', lengthUnit: 'foot', gaugeUnit: 'square-millimetre' }

describe('preferences', () => {
  it('are stored with the account', async () => {
    const { account, cookie } = await makeAccount()
    const answer = await send('PATCH', '/api/account/preferences', { cookie, json: preferences })
    expect(answer.status).toBe(200)
    expect(answer.body).toEqual({ account: { ...account, preferences } })
    expect((await send('GET', '/api/account', { cookie })).body).toEqual(answer.body)
  })

  it.each([
    [{ temperatureUnit: 'kelvin' }, 'temperatureUnit'],
    [{ email: 'x@example.org' }, 'email'],
  ])('refuse %o', async (changes, field) => {
    const { cookie } = await makeAccount()
    const json = { ...preferences, ...changes }
    const { status, body } = await send('PATCH', '/api/account/preferences', { cookie, json })
    expect(status).toBe(422)
    expect(body.errors?.map((error) => error.field)).toEqual([field])
  })

  it('leave what they were before in the audit', async () => {
    const { account, cookie } = await makeAccount()
    await send('PATCH', '/api/account/preferences', { cookie, json: preferences })
    const [rows] = await asOwner((owner) =>
      owner.query(
        'SELECT action, actor_id, `before`, `after` FROM audit_events ORDER BY sequence DESC LIMIT 1',
      ),
    )
    expect(rows).toEqual([
      {
        action: 'account.preferences-changed',
        actor_id: account.id,
        before: { preferences: account.preferences },
        after: { preferences },
      },
    ])
    expect(await verifyAuditChain(database(), accountChain(account.id))).toEqual({ intact: true, events: 2 })
  })
})
