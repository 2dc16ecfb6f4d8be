import { describe, expect, inject, it } from 'vitest'
import { send } from '../support/http'

const json = { email: 'nobody', password: 'x' }
const post = (headers: Record<string, string>) => send('POST', '/api/auth/sign-in', { json, headers })

describe('a write sent by a browser on behalf of another site', () => {
  it.each([
    [{ 'sec-fetch-site': 'cross-site' }],
    [{ 'sec-fetch-site': 'same-site' }],
    [{ origin: 'https://elsewhere.invalid' }],
    [{ origin: 'null' }],
    [{ origin: 'http://127.0.0.1:1' }],
  ])('is refused: %o', async (headers) => {
    const { status, body } = await post(headers)
    expect(status).toBe(403)
    expect(body.code).toBe('forbidden')
  })

  it.each([[{ 'sec-fetch-site': 'same-origin' }], [{ 'sec-fetch-site': 'none' }], [{}]])(
    'is not what this is: %o',
    async (headers) => {
      expect((await post(headers)).status).toBe(422)
    },
  )

  it('is not what our own origin sends', async () => {
    expect((await post({ origin: inject('baseUrl') })).status).toBe(422)
  })

  it('does not concern reading', async () => {
    const { status } = await send('GET', '/api/health', { headers: { 'sec-fetch-site': 'cross-site' } })
    expect(status).toBe(200)
  })
})
