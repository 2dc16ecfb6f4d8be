import { describe, expect, it } from 'vitest'
import { PROBLEM_CODES } from '#shared/types/problem'
import { makeAccount, send } from '../support/http'

const LIMIT_BYTES = 256 * 1024
const asJson = { 'content-type': 'application/json' }

/** The body in pieces, with no length declared beforehand. */
function inChunks(text: string, bytesEach = 16 * 1024): ReadableStream<Uint8Array> {
  const bytes = new TextEncoder().encode(text)
  let at = 0
  return new ReadableStream({
    pull(controller) {
      if (at >= bytes.length) return controller.close()
      controller.enqueue(bytes.slice(at, at + bytesEach))
      at += bytesEach
    },
  })
}

describe('every refusal is a problem', () => {
  it('of one shape, with a number to find it by', async () => {
    const { status, headers, body } = await send('GET', '/api/account')
    expect(status).toBe(401)
    expect(headers.get('content-type')).toBe('application/problem+json')
    expect(headers.get('x-request-id')).toMatch(/^[0-9a-f-]{36}$/)
    expect(body).toEqual({
      type: 'about:blank',
      title: 'Sign in first',
      status: 401,
      detail: 'Sign in to go on.',
      code: 'unauthenticated',
    })
    expect(PROBLEM_CODES).toContain(body.code)
  })

  it.each([
    ['GET', '/api/nothing-here'],
    ['GET', '/api'],
    ['DELETE', '/api/health'],
    ['GET', '/api/_auth/session'],
    ['DELETE', '/api/_auth/session'],
  ] as const)('%s %s does not exist', async (method, path) => {
    const { status, headers, body } = await send(method, path)
    expect(status).toBe(404)
    expect(headers.get('content-type')).toBe('application/problem+json')
    expect(body.code).toBe('not-found')
    expect(headers.getSetCookie()).toEqual([])
  })
})

describe('a body that cannot be read', () => {
  const post = (raw: BodyInit, headers: Record<string, string> = asJson) =>
    send('POST', '/api/auth/sign-in', { raw, headers })

  it.each([['{"email":'], [''], ['{"a":1}}'], ["{'email':'a'}"], ['{"email":"\\ud800"}']])(
    'malformed JSON: %s',
    async (raw) => {
      const { status, body } = await post(raw)
      expect(status).toBe(400)
      expect(body).toMatchObject({
        code: 'invalid-input',
        status: 400,
        detail: 'The body is not valid JSON.',
      })
    },
  )

  it.each([
    [{ 'content-type': 'text/plain' }],
    [{ 'content-type': 'application/x-www-form-urlencoded' }],
    [{ 'content-type': 'application/jsonp' }],
  ])('of another media type: %o', async (headers) => {
    const { status, body } = await post('{}', headers)
    expect(status).toBe(415)
    expect(body).toMatchObject({ code: 'invalid-input', status: 415 })
  })

  it('takes application/json with a character set', async () => {
    const { status } = await post('{}', { 'content-type': 'application/json; charset=utf-8' })
    expect(status).toBe(422)
  })

  it.each([['null'], ['[]'], ['"text"'], ['7']])('is no object: %s', async (raw) => {
    const { status, body } = await post(raw)
    expect(status).toBe(422)
    expect(body.errors?.[0]?.field).toBe('')
  })

  it('too large by its declared length', async () => {
    const { status, body } = await post(JSON.stringify({ email: 'x'.repeat(LIMIT_BYTES) }))
    expect(status).toBe(413)
    expect(body).toMatchObject({ code: 'invalid-input', detail: 'The body is larger than 256 kB.' })
  })

  it('too large in chunks', async () => {
    const { status } = await post(inChunks(JSON.stringify({ email: 'x'.repeat(LIMIT_BYTES) })))
    expect(status).toBe(413)
  })

  it('in chunks and not too large is read', async () => {
    const { status, body } = await post(inChunks(JSON.stringify({ email: 'nobody' }), 4))
    expect(status).toBe(422)
    expect(body.errors?.map(({ field }) => field)).toEqual(['email', 'password'])
  })
})

describe('fields that cannot be used', () => {
  it('are named, unknown ones too', async () => {
    const json = { email: 'x', password: 'y', isAdmin: true, ['__proto__']: 1 }
    const { status, body } = await send('POST', '/api/auth/sign-in', { json })
    expect(status).toBe(422)
    expect(body.detail).toBe(`${body.errors?.length} fields cannot be used as they are.`)
    expect(body.errors).toContainEqual({ field: 'isAdmin', reason: 'There is no field of this name.' })
  })

  it('are named when they are ids in the path', async () => {
    const { cookie } = await makeAccount()
    for (const id of ['abc', '0', '-1', '1.5', '1e99', '%00']) {
      const { status, body } = await send('GET', `/api/aircraft/${id}`, { cookie })
      expect(status).toBe(400)
      expect(body.errors?.[0]?.field).toBe('aircraftId')
    }
  })
})
