import { thermocoupleQuerySchema } from '#shared/schemas/bench'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { answerThermocouple } from '~~/server/services/bench/answerThermocouple'

export default defineApiRoute('GET /api/bench/thermocouple', {
  query: thermocoupleQuerySchema,
  handler: ({ query }) => answerThermocouple(query),
})
