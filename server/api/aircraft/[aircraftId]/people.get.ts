import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { showPeople } from '~~/server/services/people/showPeople'

export default defineApiRoute('GET /api/aircraft/:aircraftId/people', {
  handler: ({ aircraftId }) => showPeople(aircraftId),
})
