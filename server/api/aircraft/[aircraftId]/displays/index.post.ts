import { createDisplaySchema } from '#shared/schemas/display'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { createDisplay } from '~~/server/services/displays/createDisplay'

export default defineApiRoute('POST /api/aircraft/:aircraftId/displays', {
  body: createDisplaySchema,
  status: 201,
  handler: (context) => createDisplay(context, context.body),
})
