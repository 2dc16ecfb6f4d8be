import { readFileSync, readdirSync } from 'node:fs'
import { Failure } from '../failure.mjs'
import { birthOf } from '../process-table.mjs'

const PATIENCE_MILLISECONDS = 60_000
const PAUSE_MILLISECONDS = 100

/**
 * Servers that still run on a data directory although nobody holds it: what a start that was killed outright leaves
 * behind. Recognised by their own command line, so that no other server can be taken for one.
 * @param {string} directory
 * @returns {number[]} their process numbers
 */
export function serversOn(directory) {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => isServerOn(pid, directory))
}

/** @param {number} pid @param {string} directory */
function isServerOn(pid, directory) {
  try {
    const [program = '', ...parameters] = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0')
    return program.endsWith('mariadbd') && parameters.includes(`--datadir=${directory}`)
  } catch {
    return false
  }
}

/**
 * Shuts such a server down in good order. Starting on its data while it runs would damage it.
 * @param {string} directory
 * @returns {Promise<number>} how many there were
 */
export async function stopServersOn(directory) {
  const found = serversOn(directory)
  for (const pid of found) {
    const birth = birthOf(pid)
    process.kill(pid, 'SIGTERM')
    const deadline = Date.now() + PATIENCE_MILLISECONDS
    while (birth !== undefined && birthOf(pid) === birth && isServerOn(pid, directory)) {
      if (Date.now() > deadline) {
        throw new Failure(
          `A MariaDB server left over from an earlier start (process ${pid}) does not stop.`,
          {
            where: directory,
            todo: `Look at what it does; if nothing else helps: kill -9 ${pid}`,
          },
        )
      }
      await new Promise((resolve) => setTimeout(resolve, PAUSE_MILLISECONDS))
    }
  }
  return found.length
}
