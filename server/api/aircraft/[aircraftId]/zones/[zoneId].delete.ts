import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeZone } from '~~/server/services/zones/removeZone'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/zones/:zoneId', {
  query: versionQuerySchema,
  handler: (context) => removeZone(context, context.params.zoneId, context.query.version),
})
