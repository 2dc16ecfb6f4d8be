import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showDisplays } from '~~/server/services/displays/showDisplays'

export default defineApiRoute('GET /api/aircraft/:aircraftId/displays', {
  handler: ({ aircraftId }) => showDisplays(aircraftId),
})
