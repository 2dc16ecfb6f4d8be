import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showAircraft } from '~~/server/services/aircraft/showAircraft'

export default defineApiRoute('GET /api/aircraft/:aircraftId', {
  handler: (context) => showAircraft(context),
})
