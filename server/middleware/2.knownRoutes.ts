import { defineEventHandler } from 'h3'
import { AppError } from '~~/server/http/appError'
import { isKnownRoute } from '~~/server/http/knownRoutes'
import { sendProblem } from '~~/server/http/sendProblem'

/** A route without a row in the table does not answer, whichever package or file may have brought it along. */
export default defineEventHandler((event) => {
  const path = event.path.split('?', 1)[0] ?? ''
  if (path !== '/api' && !path.startsWith('/api/')) return
  if (isKnownRoute(event.method, path)) return
  return sendProblem(event, new AppError('not-found', `There is no ${event.method} ${path} here.`))
})
