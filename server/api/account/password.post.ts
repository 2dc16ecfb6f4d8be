import { changePasswordSchema } from '#shared/schemas/account'
import { startSession } from '~~/server/auth/session'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { changePassword } from '~~/server/services/account/changePassword'

export default defineApiRoute('POST /api/account/password', {
  body: changePasswordSchema,
  async handler({ event, account, body }) {
    await startSession(event, await changePassword(account, body))
  },
})
