import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeChannel } from '~~/server/services/channels/removeChannel'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/channels/:channelId', {
  query: versionQuerySchema,
  handler: (context) => removeChannel(context, context.params.channelId, context.query.version),
})
