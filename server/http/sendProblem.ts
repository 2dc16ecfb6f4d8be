import type { H3Event } from 'h3'
import { setResponseHeader, setResponseStatus } from 'h3'
import type { Problem } from '#shared/types/problem'
import { AppError, toProblem } from './appError'
import { requestId } from './requestId'
import { toAppError } from './toAppError'

/** Answers with the problem behind whatever was thrown. What nobody foresaw goes to the log alone, under a number. */
export function sendProblem(event: H3Event, error: unknown): Problem {
  const refusal = toAppError(error) ?? unforeseen(event)
  if (refusal.status >= 500) console.error(`[${requestId(event)}] ${event.method} ${event.path}`, error)
  setResponseStatus(event, refusal.status)
  setResponseHeader(event, 'content-type', 'application/problem+json')
  if (refusal.retryAfterSeconds !== undefined) {
    setResponseHeader(event, 'retry-after', refusal.retryAfterSeconds)
  }
  return toProblem(refusal)
}

function unforeseen(event: H3Event): AppError {
  return new AppError(
    'internal',
    `Nothing was changed. If it happens again, report it with the number ${requestId(event)}.`,
  )
}
