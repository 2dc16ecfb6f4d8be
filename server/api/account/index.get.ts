import { defineApiRoute } from '~~/server/http/defineApiRoute'

export default defineApiRoute('GET /api/account', {
  async handler({ account }) {
    return { account }
  },
})
