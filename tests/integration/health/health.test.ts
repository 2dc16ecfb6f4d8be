import { expect, it } from 'vitest'
import { send } from '../support/http'

it('says that the database answers', async () => {
  const { status, body } = await send('GET', '/api/health')
  expect(status).toBe(200)
  expect(body).toEqual({ status: 'ok' })
})
