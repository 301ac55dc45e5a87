// What a hold waited for has happened.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { holdSchema, releaseHoldSchema } from '@/lib/schemas/builds'
import { releaseHold } from '@/lib/services/builds/release-hold'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Release a hold with a note; a second time changes nothing', body: releaseHoldSchema, response: holdSchema,
    handle: async ({ context, params, body }) => ({ body: await releaseHold(context, pathId(params), pathId(params, 'hold'), body.note) }),
  }),
})
