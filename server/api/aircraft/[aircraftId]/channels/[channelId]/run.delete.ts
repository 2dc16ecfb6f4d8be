import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeRun } from '~~/server/services/runs/removeRun'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/channels/:channelId/run', {
  query: versionQuerySchema,
  handler: (context) => removeRun(context, context.params.channelId, context.query.version),
})
