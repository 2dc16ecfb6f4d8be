import type { z } from 'zod'
import type { FieldProblem } from '#shared/types/problem'
import { AppError } from './appError'

/** Reads a part of the request by its schema. `status` is 422 unless the request cannot be understood at all. */
export function parseWith<Schema extends z.ZodTypeAny>(
  schema: Schema,
  value: unknown,
  status = 422,
): z.output<Schema> {
  const parsed = schema.safeParse(value)
  if (parsed.success) return parsed.data
  const errors = parsed.error.issues.flatMap(toFieldProblems)
  throw new AppError('invalid-input', summary(errors), { errors, status })
}

function toFieldProblems(issue: z.ZodIssue): FieldProblem[] {
  if (issue.code !== 'unrecognized_keys') return [{ field: issue.path.join('.'), reason: issue.message }]
  return issue.keys.map((key) => ({
    field: [...issue.path, key].join('.'),
    reason: 'There is no field of this name.',
  }))
}

function summary(errors: FieldProblem[]): string {
  const [first] = errors
  if (errors.length === 1 && first) return first.reason
  return `${errors.length} fields cannot be used as they are.`
}
