import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { listGrid } from '~~/server/services/zones/listGrid'

export default defineApiRoute('GET /api/aircraft/:aircraftId/zones', {
  handler: ({ aircraftId }) => listGrid(aircraftId),
})
