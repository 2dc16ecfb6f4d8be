import { versionOnlySchema } from '#shared/schemas/aircraft'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { restoreAircraft } from '~~/server/services/aircraft/archiveAircraft'

export default defineApiRoute('POST /api/aircraft/:aircraftId/restore', {
  body: versionOnlySchema,
  handler: (context) => restoreAircraft(context, context.body.version),
})
