import { statfs } from 'node:fs/promises'
import { Failure } from '../failure.mjs'

const MEGABYTE = 1024 * 1024

/**
 * Refuses to begin what the disk has no room for: a half-written package folder or data directory is worse than
 * none at all.
 * @param {string} folder
 * @param {number} neededMegabytes
 * @param {string} purpose
 */
export async function requireFreeSpace(folder, neededMegabytes, purpose) {
  const { bavail, bsize } = await statfs(folder)
  const freeMegabytes = Math.floor((bavail * bsize) / MEGABYTE)
  if (freeMegabytes >= neededMegabytes) return
  throw new Failure(
    `The disk is nearly full: ${freeMegabytes} MB are free, ${neededMegabytes} MB are needed for ${purpose}.`,
    { where: folder, todo: 'Free some space on that file system and start again.' },
  )
}
