import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeDisplay } from '~~/server/services/displays/removeDisplay'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/displays/:displayId', {
  query: versionQuerySchema,
  handler: (context) => removeDisplay(context, context.params.displayId, context.query.version),
})
