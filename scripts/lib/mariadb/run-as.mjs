import { spawnSync } from 'node:child_process'
import { statSync } from 'node:fs'
import path from 'node:path'

const OTHERS_MAY_ENTER = 0o001

/**
 * The account to run the server as. MariaDB refuses to run as root unless told to, and the mysql account cannot
 * reach a data directory below a closed folder, such as a checkout under /root.
 * @param {{ isRoot: boolean, serverUserId: number | undefined, reachable: boolean }} facts
 * @returns {'mysql' | 'root' | undefined} nothing: run as whoever we are
 */
export function chooseServerUser({ isRoot, serverUserId, reachable }) {
  if (!isRoot) return undefined
  return serverUserId !== undefined && reachable ? 'mysql' : 'root'
}

/**
 * Whether any account can get to a folder through all the folders above it.
 * @param {string} folder
 */
export function isReachable(folder) {
  for (let above = path.dirname(folder); ; above = path.dirname(above)) {
    if ((statSync(above).mode & OTHERS_MAY_ENTER) === 0) return false
    if (above === path.dirname(above)) return true
  }
}

/**
 * The account to run the server of this data directory as, with its number.
 * @param {string} dataDirectory
 * @returns {{ name: 'mysql' | 'root' | undefined, userId: number }}
 */
export function serverUserFor(dataDirectory) {
  const ownId = process.getuid?.() ?? 0
  const serverUserId = ownId === 0 ? userIdOf('mysql') : undefined
  const name = chooseServerUser({ isRoot: ownId === 0, serverUserId, reachable: isReachable(dataDirectory) })
  return { name, userId: name === 'mysql' && serverUserId !== undefined ? serverUserId : ownId }
}

/** @param {string} name */
function userIdOf(name) {
  const { status, stdout } = spawnSync('id', ['-u', name], { encoding: 'utf8' })
  return status === 0 ? Number(stdout.trim()) : undefined
}
