import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { isKnownRoute } from '~~/server/http/knownRoutes'
import { parseWith } from '~~/server/http/parse'
import type { HeaderFacts } from '~~/server/http/securityHeaders'
import { securityHeaders, withNonce } from '~~/server/http/securityHeaders'

describe('known routes', () => {
  it.each([
    ['GET', '/api/aircraft', true],
    ['GET', '/api/aircraft/12', true],
    ['PUT', '/api/aircraft/12/states/3/temperatures/4', true],
    ['PUT', '/api/aircraft/12', false],
    ['GET', '/api/aircraft/', false],
    ['GET', '/api/aircraft/12/', false],
    ['GET', '/api/aircraft/12/zones/extra/deep', false],
    ['GET', '/api/_auth/session', false],
    ['get', '/api/aircraft', false],
    ['GET', '/x/api/aircraft', false],
  ])('%s %s: %s', (method, path, known) => {
    expect(isKnownRoute(method, path)).toBe(known)
  })
})

describe('reading by a schema', () => {
  const schema = z.object({ a: z.number(), list: z.array(z.object({ b: z.string() }).strict()) }).strict()

  it('gives what the schema makes of it', () => {
    expect(parseWith(z.object({ a: z.string().transform(Number) }), { a: '5' })).toEqual({ a: 5 })
  })

  it('names every field in dots, unknown ones too', () => {
    const read = () => parseWith(schema, { a: 'x', list: [{ b: 'fine', extra: 1 }, {}] })
    expect(read).toThrow(
      expect.objectContaining({ status: 422, message: '3 fields cannot be used as they are.' }),
    )
    try {
      read()
    } catch (error) {
      expect(error).toMatchObject({
        errors: [
          { field: 'a', reason: 'Expected number, received string' },
          { field: 'list.0.extra', reason: 'There is no field of this name.' },
          { field: 'list.1.b', reason: 'Required' },
        ],
      })
    }
  })

  it('says the reason itself when there is one', () => {
    expect(() => parseWith(schema, { list: [] }, 400)).toThrow(
      expect.objectContaining({ status: 400, message: 'Required' }),
    )
  })
})

describe('security headers', () => {
  const facts: HeaderFacts = { path: '/', nonce: 'abc', isHttps: false, isDevelopment: false }

  it('let a page run scripts with its nonce and no other inline code', () => {
    const policy = securityHeaders(facts)['content-security-policy']
    expect(policy).toContain("script-src 'self' 'nonce-abc';")
    expect(policy).not.toContain('unsafe')
  })

  it('open up in development alone', () => {
    expect(securityHeaders({ ...facts, isDevelopment: true })['content-security-policy']).toContain(
      "style-src 'self' 'unsafe-inline'",
    )
  })

  it('make no page of data', () => {
    const policy = securityHeaders({ ...facts, path: '/api/aircraft?page=2' })['content-security-policy']
    expect(policy).toBe("default-src 'none'; base-uri 'none'; frame-ancestors 'none'")
    expect(securityHeaders({ ...facts, path: '/apiary' })['content-security-policy']).toContain("'nonce-abc'")
  })

  it('promise https where there is https', () => {
    expect(securityHeaders(facts)).not.toHaveProperty('strict-transport-security')
    expect(securityHeaders({ ...facts, isHttps: true })).toHaveProperty('strict-transport-security')
  })

  it('mark script elements and nothing that looks like one', () => {
    expect(withNonce('<script>a</script><script type="module" src="x"></script>', 'n')).toBe(
      '<script nonce="n">a</script><script nonce="n" type="module" src="x"></script>',
    )
    expect(withNonce('<scripted></scripted>', 'n')).toBe('<scripted></scripted>')
  })
})
