import { defineApiRoute } from '~~/server/http/defineApiRoute'
import { checkHealth } from '~~/server/services/health/checkHealth'

export default defineApiRoute('GET /api/health', { handler: checkHealth })
