import { signInSchema } from '#shared/schemas/account'
import { clientAddress } from '~~/server/auth/clientAddress'
import { startSession } from '~~/server/auth/session'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { signIn } from '~~/server/services/account/signIn'

export default defineApiRoute('POST /api/auth/sign-in', {
  body: signInSchema,
  async handler({ event, body }) {
    const found = await signIn(body, clientAddress(event))
    await startSession(event, found)
    return { account: found.account }
  },
})
