import { benchRunSchema } from '#shared/schemas/bench'
import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { answerRun } from '~~/server/services/bench/answerRun'

export default defineApiRoute('POST /api/bench/run', {
  body: benchRunSchema,
  handler: ({ body }) => answerRun(body),
})
