import type { ChangeSummary, FieldProblem, Problem, ProblemCode } from '#shared/types/problem'

/** The HTTP status and the title of every kind of refusal. */
const KINDS = {
  'invalid-input': { status: 422, title: 'The request cannot be used as it is' },
  unauthenticated: { status: 401, title: 'Sign in first' },
  'not-found': { status: 404, title: 'Not found' },
  forbidden: { status: 403, title: 'Not allowed' },
  'stale-version': { status: 409, title: 'Changed in the meantime' },
  conflict: { status: 409, title: 'In conflict with what is stored' },
  'rate-limited': { status: 429, title: 'Too many attempts' },
  'wrong-credentials': { status: 401, title: 'Wrong e-mail address or password' },
  'out-of-range': { status: 422, title: 'Out of range' },
  unavailable: { status: 503, title: 'Not available at the moment' },
  internal: { status: 500, title: 'Something went wrong' },
} as const satisfies Record<ProblemCode, { status: number; title: string }>

export interface AppErrorDetails {
  errors?: FieldProblem[]
  changed?: ChangeSummary
  /** A narrower status of the same kind, e.g. 413 for a body that is too large. */
  status?: number
  retryAfterSeconds?: number
  cause?: unknown
}

/** The one error a service throws to refuse: a stable code, and a message for the person. */
export class AppError extends Error {
  readonly status: number
  readonly retryAfterSeconds: number | undefined
  readonly errors: FieldProblem[] | undefined
  readonly changed: ChangeSummary | undefined

  constructor(
    readonly code: ProblemCode,
    message: string,
    { errors, changed, status, retryAfterSeconds, cause }: AppErrorDetails = {},
  ) {
    super(message, { cause })
    this.name = 'AppError'
    this.status = status ?? KINDS[code].status
    this.retryAfterSeconds = retryAfterSeconds
    this.errors = errors
    this.changed = changed
  }
}

/** The record is not there, or not there for this person; the two must look the same. */
export function notFound(what: string): AppError {
  return new AppError('not-found', `There is no such ${what}.`)
}

/** One field that cannot be used, e.g. a zone of another aircraft. */
export function invalidField(field: string, reason: string): AppError {
  return new AppError('invalid-input', reason, { errors: [{ field, reason }] })
}

/** What is asked for collides with another record, which the reason names. */
export function conflict(reason: string, field?: string): AppError {
  return new AppError('conflict', reason, field === undefined ? {} : { errors: [{ field, reason }] })
}

/** The body of a refusal (RFC 9457). */
export function toProblem(error: AppError): Problem {
  return {
    type: 'about:blank',
    title: KINDS[error.code].title,
    status: error.status,
    detail: error.message,
    code: error.code,
    ...(error.errors && { errors: error.errors }),
    ...(error.changed && { changed: error.changed }),
  }
}
