import { versionOnlySchema } from '#shared/schemas/aircraft'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { archiveAircraft } from '~~/server/services/aircraft/archiveAircraft'

export default defineApiRoute('POST /api/aircraft/:aircraftId/archive', {
  body: versionOnlySchema,
  handler: (context) => archiveAircraft(context, context.body.version),
})
