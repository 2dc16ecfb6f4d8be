import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeProbe } from '~~/server/services/probes/removeProbe'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/channels/:channelId/probe', {
  query: versionQuerySchema,
  handler: (context) => removeProbe(context, context.params.channelId, context.query.version),
})
