import { randomBytes, scrypt as scryptWithCallback, timingSafeEqual } from 'node:crypto'
import { promisify } from 'node:util'

const scrypt = promisify<string, Buffer, number, { N: number; r: number; p: number }, Buffer>(
  scryptWithCallback,
)

/** As strong as OWASP's other choices (Password Storage Cheat Sheet), and 16 MiB at a time are affordable. */
const COST = { N: 16_384, r: 8, p: 5 }
const SALT_BYTES = 16
const KEY_BYTES = 32
const STORED = /^\$scrypt\$n=(\d+),r=(\d+),p=(\d+)\$([A-Za-z0-9+/]+)\$([A-Za-z0-9+/]+)$/

/** Hash of a password with a salt of its own, in the usual notation: what is stored tells how to check it. */
export async function hashPassword(password: string): Promise<string> {
  const salt = randomBytes(SALT_BYTES)
  const key = await scrypt(normalised(password), salt, KEY_BYTES, COST)
  return `$scrypt$n=${COST.N},r=${COST.r},p=${COST.p}$${base64(salt)}$${base64(key)}`
}

/** True when the password is the one that was hashed. */
export async function verifyPassword(stored: string, password: string): Promise<boolean> {
  const [, N, r, p, salt, key] = STORED.exec(stored) ?? []
  if (salt === undefined || key === undefined) throw new Error('A stored password hash cannot be read.')
  const expected = Buffer.from(key, 'base64')
  const cost = { N: Number(N), r: Number(r), p: Number(p) }
  const actual = await scrypt(normalised(password), Buffer.from(salt, 'base64'), expected.length, cost)
  return timingSafeEqual(actual, expected)
}

let decoy: Promise<string> | undefined

/**
 * Takes as long as checking a password, and is never right: for an e-mail address without an account, so that the
 * time of the answer tells nothing.
 */
export async function verifyNothing(password: string): Promise<false> {
  decoy ??= hashPassword(randomBytes(SALT_BYTES).toString('hex'))
  await verifyPassword(await decoy, password)
  return false
}

/** One keyboard writes é as one character, another as two. */
function normalised(password: string): string {
  return password.normalize('NFKC')
}

function base64(bytes: Buffer): string {
  return bytes.toString('base64').replace(/=+$/, '')
}
