import { saveRunSchema } from '#shared/schemas/run'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { saveRun } from '~~/server/services/runs/saveRun'

export default defineApiRoute('PUT /api/aircraft/:aircraftId/channels/:channelId/run', {
  body: saveRunSchema,
  handler: (context) => saveRun(context, context.params.channelId, context.body),
})
