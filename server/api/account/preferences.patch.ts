import { preferencesSchema } from '#shared/schemas/account'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { savePreferences } from '~~/server/services/account/savePreferences'

export default defineApiRoute('PATCH /api/account/preferences', {
  body: preferencesSchema,
  async handler({ account, body }) {
    return { account: await savePreferences(account, body) }
  },
})
