import { rootFolder } from './paths.mjs'

/**
 * A failure that a person can act on. It is printed as what is wrong, where, and what to do, without a stack:
 * a stack says where our script was, not what to mend.
 */
export class Failure extends Error {
  /**
   * @param {string} what what is wrong, in one sentence
   * @param {{ where?: string, todo?: string, detail?: string }} [more]
   */
  constructor(what, more = {}) {
    super(what)
    this.name = 'Failure'
    this.where = more.where
    this.todo = more.todo
    this.detail = more.detail
  }
}

const FULL_DISK_WORDS = /ENOSPC|No space left on device|Disk is full|out of disk space|err(or|no):? 28\b/i
const FULL_DISK_ADVICE =
  'Free some space on that file system and start again; nothing that was stored before is lost.'

/** Whether the words a program left behind say that the disk is full. @param {string} text */
export function saysDiskIsFull(text) {
  return FULL_DISK_WORDS.test(text)
}

/**
 * Turns whatever was thrown into a failure a person can act on.
 * @param {unknown} thrown
 * @returns {Failure}
 */
export function asFailure(thrown) {
  if (thrown instanceof Failure) {
    if (!thrown.detail || !saysDiskIsFull(thrown.detail)) return thrown
    return new Failure('The disk is full.', {
      where: thrown.where,
      todo: FULL_DISK_ADVICE,
      detail: thrown.detail,
    })
  }
  const error = /** @type {NodeJS.ErrnoException} */ (
    thrown instanceof Error ? thrown : new Error(String(thrown))
  )
  if (error.code === 'ENOSPC') {
    return new Failure('The disk is full.', { where: error.path ?? rootFolder, todo: FULL_DISK_ADVICE })
  }
  if (error.code === 'EACCES' || error.code === 'EPERM' || error.code === 'EROFS') {
    return new Failure(`Not allowed: ${error.message}.`, {
      where: error.path,
      todo: 'Give your account the right to write there, or run this as the account that owns the checkout.',
    })
  }
  return new Failure(error.message, { detail: error.stack })
}

/** The text a failure is printed as. @param {unknown} thrown */
export function failureText(thrown) {
  const failure = asFailure(thrown)
  const lines = [`Cannot go on: ${failure.message}`]
  if (failure.where) lines.push(`  Where:      ${failure.where}`)
  if (failure.todo) lines.push(`  What to do: ${failure.todo.replaceAll('\n', '\n              ')}`)
  if (failure.detail)
    lines.push(
      '',
      ...failure.detail
        .trimEnd()
        .split('\n')
        .map((line) => `  | ${line}`),
    )
  return lines.join('\n')
}
