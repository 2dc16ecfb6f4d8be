import { pageQuerySchema } from '#shared/schemas/paging'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showChannels } from '~~/server/services/channels/showChannels'

export default defineApiRoute('GET /api/aircraft/:aircraftId/channels', {
  query: pageQuerySchema,
  handler: ({ aircraftId, query }) => showChannels(aircraftId, query),
})
