import { createChannelSchema } from '#shared/schemas/channel'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { createChannel } from '~~/server/services/channels/createChannel'

export default defineApiRoute('POST /api/aircraft/:aircraftId/channels', {
  body: createChannelSchema,
  status: 201,
  handler: (context) => createChannel(context, context.body),
})
