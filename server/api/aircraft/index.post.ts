import { createAircraftSchema } from '#shared/schemas/aircraft'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { createAircraft } from '~~/server/services/aircraft/createAircraft'

export default defineApiRoute('POST /api/aircraft', {
  body: createAircraftSchema,
  status: 201,
  handler: ({ account, body }) => createAircraft(account, body),
})
