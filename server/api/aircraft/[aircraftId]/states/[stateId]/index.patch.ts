import { updateStateSchema } from '#shared/schemas/zone'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { updateState } from '~~/server/services/states/updateState'

export default defineApiRoute('PATCH /api/aircraft/:aircraftId/states/:stateId', {
  body: updateStateSchema,
  handler: (context) => updateState(context, context.params.stateId, context.body),
})
