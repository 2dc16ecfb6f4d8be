import { OutOfRangeError, RunInputError, ThermometryError } from '#shared/thermometry'
import { databaseErrno, ERRNO, isConnectionFailure } from '~~/server/db/errors'
import { AppError, conflict, invalidField } from './appError'

/** What is said when the database refuses a write that no service foresaw, by its error number. */
const DATABASE_REFUSALS: Readonly<Record<number, (cause: unknown) => AppError>> = {
  [ERRNO.duplicate]: () => conflict('Another record has these values already.'),
  [ERRNO.stillReferenced]: () => conflict('Another record still uses this one.'),
  [ERRNO.missingParent]: () => conflict('A record this one refers to is no longer there.'),
  [ERRNO.check]: () => conflict('The values do not go together.'),
  [ERRNO.deadlock]: busy,
  [ERRNO.lockWaitTimeout]: busy,
}

function busy(cause: unknown): AppError {
  return new AppError('unavailable', 'Others are writing to the same records. Try again in a moment.', {
    retryAfterSeconds: 1,
    cause,
  })
}

/** Turns whatever was thrown into the one error there is an answer for; undefined for what nobody foresaw. */
export function toAppError(error: unknown): AppError | undefined {
  if (error instanceof AppError) return error
  if (error instanceof RunInputError) return invalidField(`run.${error.field}`, error.message)
  if (error instanceof OutOfRangeError) return new AppError('out-of-range', error.message)
  if (error instanceof ThermometryError) return new AppError('invalid-input', error.message)
  if (isConnectionFailure(error)) {
    return new AppError('unavailable', 'The database does not answer. Try again in a moment.', {
      retryAfterSeconds: 5,
      cause: error,
    })
  }
  const errno = databaseErrno(error)
  return errno === undefined ? undefined : DATABASE_REFUSALS[errno]?.(error)
}
