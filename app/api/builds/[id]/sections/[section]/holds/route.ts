// Holds of a section, and what is left open on purpose: kept once, by key.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { holdSchema, newHoldSchema } from '@/lib/schemas/builds'
import { addHold } from '@/lib/services/builds/add-hold'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Make a hold, or leave something open on purpose; the same key again gives the hold that is there', body: newHoldSchema, response: holdSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const id = pathId(params)
      const hold = await addHold(context, id, params['section'] ?? '', body)
      return { body: hold, headers: { location: `/api/builds/${id}/holds/${hold.id}` } }
    },
  }),
})
