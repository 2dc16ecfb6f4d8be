import { updateDisplaySchema } from '#shared/schemas/display'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { updateDisplay } from '~~/server/services/displays/updateDisplay'

export default defineApiRoute('PATCH /api/aircraft/:aircraftId/displays/:displayId', {
  body: updateDisplaySchema,
  handler: (context) => updateDisplay(context, context.params.displayId, context.body),
})
