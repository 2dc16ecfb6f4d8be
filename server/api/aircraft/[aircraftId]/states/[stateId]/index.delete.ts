import { versionQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { removeState } from '~~/server/services/states/removeState'

export default defineApiRoute('DELETE /api/aircraft/:aircraftId/states/:stateId', {
  query: versionQuerySchema,
  handler: (context) => removeState(context, context.params.stateId, context.query.version),
})
