import { aircraftQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { listAircraft } from '~~/server/services/aircraft/listAircraft'

export default defineApiRoute('GET /api/aircraft', {
  query: aircraftQuerySchema,
  handler: ({ account, query }) => listAircraft(account, query),
})
