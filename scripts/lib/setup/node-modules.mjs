import { createHash } from 'node:crypto'
import { existsSync } from 'node:fs'
import { readFile, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { lastLines, runToEnd } from '../child-processes.mjs'
import { step } from '../progress.mjs'
import { requireFreeSpace } from './disk.mjs'

const OLDEST_NODE = [20, 19]
const NEEDED_MEGABYTES = 1200

/** Refuses a Node too old to run what follows. @param {string} [version] */
export function requireNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number)
  const [oldestMajor = 0, oldestMinor = 0] = OLDEST_NODE
  if (major > oldestMajor || (major === oldestMajor && minor >= oldestMinor)) return
  throw new Failure(`Node ${version} is too old.`, {
    todo: `Install Node ${OLDEST_NODE.join('.')} or a later 20.x.`,
  })
}

/**
 * What the package folder must match: the lock, and the Node whose binaries were chosen.
 * @param {string | Buffer} lockText
 * @param {string} [platform]
 */
export function lockFingerprint(lockText, platform = `${process.platform}-${process.arch}`) {
  return createHash('sha256').update(platform).update('\n').update(lockText).digest('hex')
}

/**
 * Whether the record npm itself keeps of what it installed agrees with the lock: then somebody has run `npm ci` or
 * `npm install` by hand, and doing it again would be a waste of a minute.
 * @param {{ packages?: Record<string, LockedPackage> }} lock
 * @param {{ packages?: Record<string, LockedPackage> }} installed
 */
export function installedMatchesLock(lock, installed) {
  const locked = lock.packages ?? {}
  const present = installed.packages ?? {}
  if (Object.keys(present).length === 0) return false
  const known = Object.entries(present).every(([place, found]) => isSame(locked[place], found))
  const complete = Object.entries(locked).every(
    ([place, wanted]) =>
      place === '' || wanted.optional === true || wanted.devOptional === true || place in present,
  )
  return known && complete
}

/** @typedef {{ version?: string, integrity?: string, optional?: boolean, devOptional?: boolean }} LockedPackage */

/** @param {LockedPackage | undefined} wanted @param {LockedPackage} found */
function isSame(wanted, found) {
  return wanted?.version === found.version && wanted?.integrity === found.integrity
}

/** Installs the npm packages when they are missing or do not match package-lock.json. @param {string} root */
export function ensureNodeModules(root) {
  return step('npm packages', async (note) => {
    const lockText = await readFile(path.join(root, 'package-lock.json'), 'utf8')
    const stampFile = path.join(root, 'node_modules', '.cowlbook-lock')
    const fingerprint = lockFingerprint(lockText)
    if ((await readOr(stampFile, '')) === fingerprint) return note('match package-lock.json')
    if (await npmSaysInstalled(root, lockText)) {
      await writeFile(stampFile, fingerprint)
      return note('match package-lock.json')
    }
    await requireFreeSpace(root, NEEDED_MEGABYTES, 'the npm packages')
    note(existsSync(path.join(root, 'node_modules')) ? 'npm ci, because the lock has changed' : 'npm ci')
    await cleanInstall(root)
    await writeFile(stampFile, fingerprint)
    note('installed by npm ci')
  })
}

/** @param {string} root @param {string} lockText */
async function npmSaysInstalled(root, lockText) {
  const record = await readOr(path.join(root, 'node_modules', '.package-lock.json'), '{}')
  try {
    return installedMatchesLock(JSON.parse(lockText), JSON.parse(record))
  } catch {
    return false
  }
}

/** @param {string} root */
async function cleanInstall(root) {
  // Development packages are needed to build, whatever NODE_ENV the surroundings have set.
  const { code, output } = await runToEnd('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'development' },
  })
  if (code === 0) return
  throw new Failure('npm ci failed.', {
    where: root,
    todo: 'Check the network and the npm registry (npm ping), then start again.',
    detail: lastLines(output),
  })
}

/** @param {string} file @param {string} otherwise */
async function readOr(file, otherwise) {
  return readFile(file, 'utf8').catch(() => otherwise)
}
