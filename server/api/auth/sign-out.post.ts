import { endSession } from '~~/server/auth/session'
import { defineApiRoute } from '~~/server/http/defineApiRoute'

export default defineApiRoute('POST /api/auth/sign-out', {
  handler: ({ event }) => endSession(event),
})
