import { registerSchema } from '#shared/schemas/account'
import { clientAddress } from '~~/server/auth/clientAddress'
import { startSession } from '~~/server/auth/session'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { register } from '~~/server/services/account/register'

export default defineApiRoute('POST /api/auth/register', {
  body: registerSchema,
  status: 201,
  async handler({ event, body }) {
    const registered = await register(body, clientAddress(event))
    await startSession(event, registered)
    return { account: registered.account }
  },
})
