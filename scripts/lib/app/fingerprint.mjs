import { createHash } from 'node:crypto'
import { readFile, readdir, stat } from 'node:fs/promises'
import path from 'node:path'

/**
 * All files at or below the given places, as sorted relative paths with forward slashes. Places that do not exist
 * count as empty.
 * @param {string} root
 * @param {string[]} places
 */
export async function filesBelow(root, places) {
  const found = await Promise.all(places.map((place) => walk(root, place)))
  return found.flat().sort()
}

/**
 * @param {string} root
 * @param {string} place
 * @returns {Promise<string[]>}
 */
async function walk(root, place) {
  const status = await stat(path.join(root, place)).catch(() => undefined)
  if (!status) return []
  if (status.isFile()) return [place]
  const names = await readdir(path.join(root, place))
  const below = await Promise.all(names.map((name) => walk(root, `${place}/${name}`)))
  return below.flat()
}

/**
 * A hash over the names and contents of files: it changes when one is altered, added, removed or renamed, and not
 * when a checkout merely gives it another date.
 * @param {string} root
 * @param {string[]} places
 * @param {string[]} [facts] other things the result depends on
 */
export async function fingerprint(root, places, facts = []) {
  const hash = createHash('sha256')
  for (const fact of facts) hash.update(`${fact}\0`)
  for (const file of await filesBelow(root, places)) {
    const content = await readFile(path.join(root, file))
    hash.update(`${file}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}
