import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showChannel } from '~~/server/services/channels/showChannel'

export default defineApiRoute('GET /api/aircraft/:aircraftId/channels/:channelId', {
  handler: (context) => showChannel(context, context.params.channelId),
})
