import { pageQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showHistory } from '~~/server/services/history/showHistory'

export default defineApiRoute('GET /api/aircraft/:aircraftId/history', {
  query: pageQuerySchema,
  handler: ({ aircraftId, query }) => showHistory(aircraftId, query),
})
