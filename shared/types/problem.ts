/** One field that was refused, and why (RFC 9457 extension member `errors`). */
export interface FieldProblem {
  /** Path of the field in the request, dotted, e.g. `run.sections.0.positive`; empty for the whole body. */
  field: string
  reason: string
}

/** What has changed since the version a refused write was based on. */
export interface ChangeSummary {
  /** The version now stored. */
  version: number
  /** Fields whose stored value differs from the one the writer started from, with the value now stored. */
  fields: { field: string; current: unknown }[]
  changedBy: string | null
  changedAt: string | null
}

export const PROBLEM_CODES = [
  'invalid-input',
  'unauthenticated',
  'not-found',
  'forbidden',
  'stale-version',
  'conflict',
  'rate-limited',
  'wrong-credentials',
  'out-of-range',
  'unavailable',
  'internal',
] as const
export type ProblemCode = (typeof PROBLEM_CODES)[number]

/** The body of every refusal: application/problem+json (RFC 9457). */
export interface Problem {
  type: string
  title: string
  status: number
  detail: string
  code: ProblemCode
  errors?: FieldProblem[]
  changed?: ChangeSummary
}
