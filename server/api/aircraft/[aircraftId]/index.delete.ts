import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeAircraft } from '~~/server/services/aircraft/removeAircraft'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId', {
  query: versionQuerySchema,
  handler: (context) => removeAircraft(context, context.query.version),
})
