import { randomBytes } from 'node:crypto'
import { chmod, readFile, rename, writeFile } from 'node:fs/promises'
import { Failure } from '../failure.mjs'

const NAMES = /** @type {const} */ ([
  'sessionPassword',
  'databaseRoot',
  'databaseOwner',
  'databaseApplication',
])
const SHORTEST = 32

/** @typedef {Record<typeof NAMES[number], string>} Secrets */

/**
 * Fills in what is missing. Hexadecimal, so that a password needs no escaping in SQL or in a URL.
 * @param {Partial<Record<string, unknown>>} kept
 * @param {() => string} [generate]
 * @returns {{ secrets: Secrets, added: boolean }}
 */
export function completeSecrets(kept, generate = () => randomBytes(24).toString('hex')) {
  let added = false
  const pairs = NAMES.map((name) => {
    const value = kept[name]
    if (typeof value === 'string' && value.length >= SHORTEST && /^[0-9a-f]+$/.test(value))
      return [name, value]
    added = true
    return [name, generate()]
  })
  return { secrets: Object.fromEntries(pairs), added }
}

/**
 * The secrets of this installation, generated once and readable by their owner alone.
 * @param {string} file
 * @returns {Promise<Secrets>}
 */
export async function loadSecrets(file) {
  const text = await readFile(file, 'utf8').catch((/** @type {NodeJS.ErrnoException} */ error) => {
    if (error.code === 'ENOENT') return '{}'
    throw error
  })
  const { secrets, added } = completeSecrets(parse(text, file))
  if (added) {
    await writeFile(`${file}.new`, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 })
    await rename(`${file}.new`, file)
  }
  await chmod(file, 0o600)
  return secrets
}

/** @param {string} text @param {string} file */
function parse(text, file) {
  try {
    return JSON.parse(text)
  } catch {
    throw new Failure('The file with the generated secrets cannot be read as JSON.', {
      where: file,
      todo: 'Delete it: new secrets are made at the next start, and everybody has to sign in again.',
    })
  }
}
