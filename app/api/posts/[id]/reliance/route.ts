// "I'm going by this", set and taken off.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { relianceInputSchema } from '@/lib/schemas/acts'
import { goBy } from '@/lib/services/outcomes/go-by'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  PUT: endpoint({
    summary: 'I’m going by this', body: relianceInputSchema, status: 204,
    handle: async ({ context, params }) => {
      await goBy(context, pathId(params), true)
      return {}
    },
  }),
  DELETE: endpoint({
    summary: 'I’m not going by this any more', status: 204,
    handle: async ({ context, params }) => {
      await goBy(context, pathId(params), false)
      return {}
    },
  }),
})
