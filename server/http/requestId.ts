import { randomUUID } from 'node:crypto'
import type { H3Event } from 'h3'

declare module 'h3' {
  interface H3EventContext {
    requestId?: string
  }
}

/** The number under which a request stands in the log and in the header of its answer. */
export function requestId(event: H3Event): string {
  event.context.requestId ??= randomUUID()
  return event.context.requestId
}
