import { describe, expect, it } from 'vitest'
import { hashPassword, verifyNothing, verifyPassword } from '~~/server/auth/passwords'

describe('a password', () => {
  it('is known again, and no other is', async () => {
    const stored = await hashPassword('correct horse')
    expect(await verifyPassword(stored, 'correct horse')).toBe(true)
    expect(await verifyPassword(stored, 'correct horses')).toBe(false)
    expect(await verifyPassword(stored, '')).toBe(false)
  })

  it('is salted, and its hash tells how it was made', async () => {
    const [one, other] = await Promise.all([hashPassword('same'), hashPassword('same')])
    expect(one).not.toBe(other)
    expect(one).toMatch(/^\$scrypt\$n=16384,r=8,p=5\$[A-Za-z0-9+/]{22}\$[A-Za-z0-9+/]{43}$/)
    expect(one.length).toBeLessThan(255)
  })

  it('counts the same however the keyboard composes its letters', async () => {
    const stored = await hashPassword('caf\u00e9')
    expect(await verifyPassword(stored, 'cafe\u0301')).toBe(true)
  })

  it('hashed with other costs can still be checked', async () => {
    // Test vector of RFC 7914 §12: scrypt("password", "NaCl", N=1024, r=8, p=16), its first 32 bytes.
    const key = Buffer.from('fdbabe1c9d3472007856e7190d01e9fe7c6ad7cbc8237830e77376634b373162', 'hex')
    const salt = Buffer.from('NaCl').toString('base64').replace(/=+$/, '')
    const stored = `$scrypt$n=1024,r=8,p=16$${salt}$${key.toString('base64').replace(/=+$/, '')}`
    expect(await verifyPassword(stored, 'password')).toBe(true)
    expect(await verifyPassword(stored, 'passwort')).toBe(false)
  })

  it('is never right where there is no account', async () => {
    expect(await verifyNothing('anything')).toBe(false)
  })

  it.each([[''], ['plain text'], ['$scrypt$n=1,r=8$a$b']])(
    'stored as "%s" is an error, not a match',
    async (stored) => {
      await expect(verifyPassword(stored, 'x')).rejects.toThrow('cannot be read')
    },
  )
})
