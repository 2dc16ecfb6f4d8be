import { logProbeSchema } from '#shared/schemas/probe'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { logProbe } from '~~/server/services/probes/logProbe'

export default defineApiRoute('PUT /api/aircraft/:aircraftId/channels/:channelId/probe', {
  body: logProbeSchema,
  handler: (context) => logProbe(context, context.params.channelId, context.body),
})
