import { existsSync, readdirSync, statSync } from 'node:fs'
import { chown, mkdir, rename, rm } from 'node:fs/promises'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { lastLines, runToEnd } from '../child-processes.mjs'
import { requireFreeSpace } from '../setup/disk.mjs'
import { findProgram } from '../setup/debian.mjs'
import { shown } from '../paths.mjs'

const NEEDED_TO_MAKE_MEGABYTES = 300
// The server writes its temporary tablespace anew at every start.
const NEEDED_TO_RUN_MEGABYTES = 60

/**
 * What to do about a data directory that the server cannot use.
 * @param {string} directory
 */
export function brokenDirectoryAdvice(directory) {
  return (
    `If a backup of ${shown(directory)} exists, put it back. Otherwise move the directory away, so that nothing is\n` +
    `lost for good, and start again; a new, empty database is made:\nmv ${directory} ${directory}-broken`
  )
}

/**
 * Makes the data directory on the first start, and looks at it on every later one.
 * @param {string} directory
 * @param {{ name: string | undefined, userId: number }} user
 * @returns {Promise<'made' | 'found'>}
 */
export async function prepareDataDirectory(directory, user) {
  if (existsSync(directory) && readdirSync(directory).length > 0) {
    if (!existsSync(path.join(directory, 'mysql'))) {
      throw new Failure('The data directory is broken: the system tables of MariaDB are missing from it.', {
        where: directory,
        todo: brokenDirectoryAdvice(directory),
      })
    }
    await requireFreeSpace(directory, NEEDED_TO_RUN_MEGABYTES, 'the database to run')
    await handOver(directory, user)
    return 'found'
  }
  await requireFreeSpace(path.dirname(directory), NEEDED_TO_MAKE_MEGABYTES, 'a new database')
  await makeDataDirectory(directory, user)
  return 'made'
}

/** @param {string} directory @param {{ name: string | undefined, userId: number }} user */
async function makeDataDirectory(directory, user) {
  // Made under another name and renamed when whole: a start cut short leaves no half-made directory behind.
  const draft = `${directory}.new`
  await rm(draft, { recursive: true, force: true })
  await mkdir(draft, { mode: 0o700 })
  if (user.name) await chown(draft, user.userId, -1)
  const { code, output } = await runToEnd(findProgram('mariadb-install-db') ?? 'mariadb-install-db', [
    '--no-defaults',
    `--datadir=${draft}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    ...(user.name ? [`--user=${user.name}`] : []),
  ])
  if (code !== 0) {
    throw new Failure('MariaDB could not make its data directory.', {
      where: directory,
      todo: 'The reason is in the lines below.',
      detail: lastLines(output),
    })
  }
  await rm(directory, { recursive: true, force: true })
  await rename(draft, directory)
}

/**
 * A checkout that was moved, or is started by another account, still has its files owned by the former one.
 * @param {string} directory
 * @param {{ name: string | undefined, userId: number }} user
 */
async function handOver(directory, user) {
  const owner = statSync(directory).uid
  if (owner === user.userId) return
  if (!user.name) {
    throw new Failure('The data directory belongs to another account.', {
      where: directory,
      todo: `Start as the account it belongs to, or hand it over: sudo chown -R $(id -u) ${directory}`,
    })
  }
  const { code, output } = await runToEnd('chown', ['-R', String(user.userId), directory])
  if (code !== 0)
    throw new Failure('The data directory could not be handed over.', { where: directory, detail: output })
}
