import { updateChannelSchema } from '#shared/schemas/channel'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { updateChannel } from '~~/server/services/channels/updateChannel'

export default defineApiRoute('PATCH /api/aircraft/:aircraftId/channels/:channelId', {
  body: updateChannelSchema,
  handler: (context) => updateChannel(context, context.params.channelId, context.body),
})
