import { defineEventHandler, setResponseHeader } from 'h3'
import { requestId } from '~~/server/http/requestId'

/** Every answer carries the number under which its request stands in the log. */
export default defineEventHandler((event) => {
  setResponseHeader(event, 'x-request-id', requestId(event))
})
