import { createZoneSchema } from '#shared/schemas/zone'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { createZone } from '~~/server/services/zones/createZone'

export default defineApiRoute('POST /api/aircraft/:aircraftId/zones', {
  body: createZoneSchema,
  status: 201,
  handler: (context) => createZone(context, context.body),
})
