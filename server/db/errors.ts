/** Numbers under which MariaDB refuses a statement. */
export const ERRNO = {
  duplicate: 1062,
  lockWaitTimeout: 1205,
  deadlock: 1213,
  stillReferenced: 1451,
  missingParent: 1452,
  check: 4025,
} as const

/**
 * The server's error number, or undefined for any other error. Drizzle wraps what the driver throws, so the causes
 * are followed; the driver's code names are not used, for they are MySQL's and differ from MariaDB's.
 */
export function databaseErrno(error: unknown): number | undefined {
  for (let at = error, depth = 0; at instanceof Error && depth < 5; at = at.cause, depth++) {
    if ('errno' in at && typeof at.errno === 'number' && 'sqlState' in at) return at.errno
  }
  return undefined
}

export function isDeadlock(error: unknown): boolean {
  return databaseErrno(error) === ERRNO.deadlock
}

/** True when a unique key refused the row; `key` narrows it to one by name. */
export function isDuplicate(error: unknown, key?: string): boolean {
  if (databaseErrno(error) !== ERRNO.duplicate) return false
  return key === undefined || causes(error).some((cause) => cause.message.includes(`'${key}'`))
}

function causes(error: unknown): Error[] {
  return error instanceof Error ? [error, ...causes(error.cause)] : []
}

const CONNECTION_FAILURES = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ENOENT',
  'ENOTFOUND',
  'EPIPE',
  'ETIMEDOUT',
  'PROTOCOL_CONNECTION_LOST',
])

/** True when the database could not be reached at all, or was lost on the way. */
export function isConnectionFailure(error: unknown): boolean {
  return causes(error).some(
    (cause) => 'code' in cause && typeof cause.code === 'string' && CONNECTION_FAILURES.has(cause.code),
  )
}
