import { rmSync } from 'node:fs'
import { link, mkdir, readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { Failure } from '../failure.mjs'
import { birthOf } from '../process-table.mjs'
import { onTeardown } from '../teardown.mjs'

/** @typedef {{ pid: number, birth: string, command: string }} Holder */

/**
 * Who works on a data folder now.
 * @param {string} file
 * @returns {Promise<Holder | undefined>}
 */
export async function lockHolder(file) {
  const text = await readFile(file, 'utf8').catch(() => '')
  try {
    const holder = /** @type {Holder} */ (JSON.parse(text))
    return birthOf(holder.pid) === holder.birth ? holder : undefined
  } catch {
    return undefined
  }
}

/**
 * Takes a data folder for this process, or refuses when another one works on it.
 * @param {string} file
 * @param {string} command what this process was started as
 * @returns {Promise<void>}
 */
export async function takeLock(file, command) {
  await mkdir(path.dirname(file), { recursive: true })
  const mine = { pid: process.pid, birth: birthOf(process.pid) ?? '', command }
  const draft = `${file}.${process.pid}`
  try {
    await writeFile(draft, JSON.stringify(mine))
    const holder = await lockHolder(file)
    if (holder) refuse(holder, file)
    await rm(file, { force: true })
    // A link is made whole or not at all, so two starts in the same instant cannot both succeed.
    await link(draft, file).catch(async () => refuse((await lockHolder(file)) ?? mine, file))
  } finally {
    await rm(draft, { force: true })
  }
  onTeardown('the lock', () => rmSync(file, { force: true }))
}

/** @param {Holder} holder @param {string} file @returns {never} */
function refuse(holder, file) {
  throw new Failure(`"${holder.command}" is already running on this data folder (process ${holder.pid}).`, {
    where: path.dirname(file),
    todo: `Use the one that runs, or stop it first: Ctrl-C in its terminal, or kill ${holder.pid}`,
  })
}
