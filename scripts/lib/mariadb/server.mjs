import { closeSync, openSync, readFileSync } from 'node:fs'
import { chown, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'
import mysql from 'mysql2/promise'
import { Failure } from '../failure.mjs'
import { hasEnded, lastLines, startApart, stopGroup } from '../child-processes.mjs'
import { findProgram } from '../setup/debian.mjs'
import { onTeardown } from '../teardown.mjs'
import { OWNER, accountStatements } from './accounts.mjs'
import { brokenDirectoryAdvice } from './data-directory.mjs'

const READY_WITHIN_MILLISECONDS = 120_000
const STOP_WITHIN_MILLISECONDS = 60_000
const PAUSE_MILLISECONDS = 50
const PORT_TAKEN = /Can't start server: Bind on TCP\/IP port|Address already in use/
const HELD_BY_ANOTHER = /Unable to lock .\/ibdata1|Can't lock aria control file/

/**
 * @typedef {object} ServerPlan
 * @property {string} home folder for the log and the accounts file
 * @property {string} directory data directory
 * @property {number} port
 * @property {string[]} databases
 * @property {import('../setup/secrets.mjs').Secrets} secrets
 * @property {{ name: string | undefined, userId: number }} user
 * @property {boolean} throwAway whether its data may be lost with the machine
 */

/** @typedef {{ child: import('node:child_process').ChildProcess, stop: () => Promise<void>, log: string }} RunningServer */

/**
 * Starts the server and waits until the owner account can sign in.
 * @param {ServerPlan} plan
 * @returns {Promise<RunningServer | 'port taken'>}
 */
export async function startServer(plan) {
  const log = path.join(plan.home, 'mariadb.log')
  const accountsFile = path.join(plan.home, 'mariadb-accounts.sql')
  await rm(accountsFile, { force: true })
  const statements = accountStatements(plan.databases, plan.secrets)
  await writeFile(accountsFile, `${statements.join(';\n')};\n`, { mode: 0o600 })
  if (plan.user.name) await chown(accountsFile, plan.user.userId, -1)
  try {
    const child = launch(plan, log, accountsFile)
    const stop = () => stopGroup(child, { patienceMilliseconds: STOP_WITHIN_MILLISECONDS })
    const forget = onTeardown('MariaDB', stop)
    const ready = await waitUntilReady(child, plan)
    if (ready) return { child, stop: () => stop().then(forget), log }
    forget()
    const said = readFileSync(log, 'utf8')
    if (PORT_TAKEN.test(said)) return 'port taken'
    throw failureFromLog(said, plan.directory, log)
  } finally {
    await rm(accountsFile, { force: true })
  }
}

/** @param {ServerPlan} plan @param {string} log @param {string} accountsFile */
function launch(plan, log, accountsFile) {
  const output = openSync(log, 'w', 0o600)
  try {
    const child = startApart(findProgram('mariadbd') ?? 'mariadbd', serverParameters(plan, accountsFile), {
      stdio: ['ignore', output, output],
    })
    child.once('error', () => {})
    return child
  } finally {
    closeSync(output)
  }
}

/** @param {ServerPlan} plan @param {string} accountsFile */
function serverParameters(plan, accountsFile) {
  return [
    '--no-defaults',
    `--datadir=${plan.directory}`,
    // Relative to the data directory: an absolute path could exceed the 107 characters a socket address holds.
    '--socket=mariadb.sock',
    '--pid-file=mariadb.pid',
    '--bind-address=127.0.0.1',
    `--port=${plan.port}`,
    `--init-file=${accountsFile}`,
    '--skip-name-resolve',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--default-time-zone=+00:00',
    ...(plan.user.name ? [`--user=${plan.user.name}`] : []),
    ...(plan.throwAway ? ['--innodb-flush-log-at-trx-commit=0', '--skip-innodb-doublewrite'] : []),
  ]
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @param {ServerPlan} plan
 * @returns {Promise<boolean>} false when the server ended instead
 */
async function waitUntilReady(child, plan) {
  const deadline = Date.now() + READY_WITHIN_MILLISECONDS
  while (!hasEnded(child)) {
    if (await ownerCanSignIn(plan)) return true
    if (Date.now() > deadline) {
      await stopGroup(child)
      throw new Failure(`MariaDB did not answer within ${READY_WITHIN_MILLISECONDS / 1000} s.`, {
        where: `127.0.0.1, port ${plan.port}`,
        detail: lastLines(readFileSync(path.join(plan.home, 'mariadb.log'), 'utf8')),
      })
    }
    await new Promise((resolve) => setTimeout(resolve, PAUSE_MILLISECONDS))
  }
  return false
}

/** @param {ServerPlan} plan */
async function ownerCanSignIn({ port, databases, secrets }) {
  try {
    const connection = await mysql.createConnection({
      host: '127.0.0.1',
      port,
      user: OWNER,
      password: secrets.databaseOwner,
      database: databases[0],
      connectTimeout: 2000,
    })
    await connection.end()
    return true
  } catch {
    return false
  }
}

/** @param {string} said @param {string} directory @param {string} log */
function failureFromLog(said, directory, log) {
  const detail = `${log}:\n${lastLines(said, 16)}`
  if (HELD_BY_ANOTHER.test(said)) {
    return new Failure('Another MariaDB server works on this data directory.', {
      where: directory,
      todo: 'Stop that server in good order; two servers on the same files would damage them.',
      detail,
    })
  }
  return new Failure('MariaDB cannot use its data directory; the end of its error log says why.', {
    where: directory,
    todo: brokenDirectoryAdvice(directory),
    detail,
  })
}
