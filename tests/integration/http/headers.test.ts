import { describe, expect, it } from 'vitest'
import { send } from '../support/http'

const page = () => send<string>('GET', '/', { headers: { accept: 'text/html' } })
const policyOf = ({ headers }: { headers: Headers }) => headers.get('content-security-policy') ?? ''

describe('a page', () => {
  it('runs its own scripts alone, by a nonce of its own', async () => {
    const answer = await page()
    expect(answer.status).toBe(200)
    const nonce = /'nonce-([A-Za-z0-9+/=]+)'/.exec(policyOf(answer))?.[1]
    expect(nonce).toBeDefined()
    const scripts = answer.body.match(/<script[^>]*>/g) ?? []
    expect(scripts.length).toBeGreaterThan(0)
    expect(scripts.filter((tag) => !tag.includes(`nonce="${nonce}"`))).toEqual([])
    expect(policyOf(await page())).not.toBe(policyOf(answer))
  })

  it('has a policy without holes, and no style of its own', async () => {
    const answer = await page()
    expect(policyOf(answer)).not.toContain('unsafe')
    for (const directive of ["default-src 'self'", "object-src 'none'", "base-uri 'none'"]) {
      expect(policyOf(answer)).toContain(directive)
    }
    expect(policyOf(answer)).toContain("frame-ancestors 'none'")
    expect(answer.body).not.toMatch(/<style|\sstyle="/)
  })

  it('does not say what it is made with, nor claim https', async () => {
    const { headers } = await page()
    expect(headers.get('x-powered-by')).toBeNull()
    expect(headers.get('strict-transport-security')).toBeNull()
  })

  it('that is not there has the same protection', async () => {
    const answer = await send('GET', '/no/such/page', { headers: { accept: 'text/html' } })
    expect(answer.status).toBe(404)
    expect(policyOf(answer)).toContain("default-src 'self'")
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff')
  })
})

describe('an answer of the API', () => {
  it('is never a page, and never kept', async () => {
    const { headers } = await send('GET', '/api/health')
    expect(headers.get('content-security-policy')).toContain("default-src 'none'")
    expect(headers.get('cache-control')).toBe('no-store')
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('referrer-policy')).toBe('same-origin')
    expect(headers.get('x-frame-options')).toBe('DENY')
    expect(headers.get('cross-origin-opener-policy')).toBe('same-origin')
    expect(headers.get('cross-origin-resource-policy')).toBe('same-origin')
    expect(headers.get('permissions-policy')).toContain('camera=()')
  })
})

describe('a file', () => {
  it('has them as well', async () => {
    const { body } = await page()
    const file = /"(\/_nuxt\/[^"]+\.js)"/.exec(body)?.[1] ?? 'no script on the page'
    const { status, headers } = await send('GET', file)
    expect(status).toBe(200)
    expect(headers.get('x-content-type-options')).toBe('nosniff')
  })
})
