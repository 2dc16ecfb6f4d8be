import { updateAircraftSchema } from '#shared/schemas/aircraft'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { updateAircraft } from '~~/server/services/aircraft/updateAircraft'

export default defineApiRoute('PATCH /api/aircraft/:aircraftId', {
  body: updateAircraftSchema,
  handler: (context) => updateAircraft(context, context.body),
})
