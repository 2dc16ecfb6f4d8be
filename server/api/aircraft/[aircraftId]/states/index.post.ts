import { createStateSchema } from '#shared/schemas/zone'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { createState } from '~~/server/services/states/createState'

export default defineApiRoute('POST /api/aircraft/:aircraftId/states', {
  body: createStateSchema,
  status: 201,
  handler: (context) => createState(context, context.body),
})
