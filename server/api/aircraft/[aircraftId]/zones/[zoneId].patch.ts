import { updateZoneSchema } from '#shared/schemas/zone'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { updateZone } from '~~/server/services/zones/updateZone'

export default defineApiRoute('PATCH /api/aircraft/:aircraftId/zones/:zoneId', {
  body: updateZoneSchema,
  handler: (context) => updateZone(context, context.params.zoneId, context.body),
})
