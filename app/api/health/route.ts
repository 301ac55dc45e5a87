// Whether this installation can serve; open to whoever watches it.
import { endpoint, routes } from '@/lib/http/route'
import { healthSchema } from '@/lib/schemas/health'
import { checkHealth } from '@/lib/services/health/check-health'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'Whether this installation can serve', isAlwaysOpen: true, response: healthSchema,
    handle: async ({ context }) => {
      const body = await checkHealth(context)
      return body.status === 'ok' ? { body } : { body, status: 503, headers: { 'retry-after': '5' } }
    },
  }),
})
