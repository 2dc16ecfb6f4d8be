import { chmod, mkdir, readFile, stat, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { choosePort } from '../ports.mjs'
import { APPLICATION, OWNER, databaseUrl } from './accounts.mjs'
import { prepareDataDirectory } from './data-directory.mjs'
import { stopServersOn } from './left-over.mjs'
import { serverUserFor } from './run-as.mjs'
import { startServer } from './server.mjs'

const PORT_ATTEMPTS = 5
// Others may pass through to what they own below, and see nothing else.
const HOME_MODE = 0o711

/**
 * @typedef {object} Instance a private server that answers
 * @property {number} port
 * @property {(database: string) => { ownerUrl: string, applicationUrl: string }} urls
 * @property {import('./server.mjs').RunningServer} server
 * @property {string} remark for the progress line
 */

/**
 * Brings up a private MariaDB on loopback with its data below `home`.
 * @param {{ home: string, databases: string[], secrets: import('../setup/secrets.mjs').Secrets, throwAway?: boolean }} wanted
 * @returns {Promise<Instance>}
 */
export async function startInstance({ home, databases, secrets, throwAway = false }) {
  await prepareHome(home)
  const directory = path.join(home, 'mariadb')
  const stopped = await stopServersOn(directory)
  const user = serverUserFor(directory)
  const prepared = await prepareDataDirectory(directory, user)
  let remembered = await rememberedPort(home)
  for (let attempt = 0; attempt < PORT_ATTEMPTS; attempt += 1) {
    const port = await choosePort({ remembered })
    const server = await startServer({ home, directory, port, databases, secrets, user, throwAway })
    if (server === 'port taken') {
      remembered = undefined
      continue
    }
    await writeFile(portFile(home), `${JSON.stringify({ port })}\n`)
    const remark = [
      `127.0.0.1:${port}`,
      prepared === 'made' ? 'new data directory' : '',
      stopped > 0 ? 'after stopping one left over' : '',
    ]
    return {
      port,
      server,
      urls: (database) => instanceUrls(port, database, secrets),
      remark: remark.filter(Boolean).join(', '),
    }
  }
  throw new Failure(`MariaDB found its port taken ${PORT_ATTEMPTS} times in a row.`, {
    todo: 'See what takes ports on this machine: ss -ltnp',
  })
}

/**
 * Both ways into a database of the instance: the owner migrates, the application works.
 * @param {number} port
 * @param {string} database
 * @param {import('../setup/secrets.mjs').Secrets} secrets
 */
export function instanceUrls(port, database, secrets) {
  return {
    ownerUrl: databaseUrl({ user: OWNER, password: secrets.databaseOwner, port, database }),
    applicationUrl: databaseUrl({ user: APPLICATION, password: secrets.databaseApplication, port, database }),
  }
}

/** @param {string} home */
async function prepareHome(home) {
  await mkdir(home, { recursive: true, mode: HOME_MODE })
  const { uid } = await stat(home)
  if (uid === process.getuid?.()) await chmod(home, HOME_MODE)
}

/** @param {string} home */
function portFile(home) {
  return path.join(home, 'mariadb.json')
}

/**
 * The port used last time.
 * @param {string} home
 * @returns {Promise<number | undefined>}
 */
export async function rememberedPort(home) {
  try {
    const { port } = JSON.parse(await readFile(portFile(home), 'utf8'))
    return Number.isInteger(port) ? port : undefined
  } catch {
    return undefined
  }
}
