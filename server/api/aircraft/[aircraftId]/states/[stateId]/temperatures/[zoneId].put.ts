import { setTemperatureSchema } from '#shared/schemas/zone'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { setTemperature } from '~~/server/services/zones/setTemperature'

export default defineApiRoute('PUT /api/aircraft/:aircraftId/states/:stateId/temperatures/:zoneId', {
  body: setTemperatureSchema,
  handler: (context) => setTemperature(context, context.params, context.body),
})
