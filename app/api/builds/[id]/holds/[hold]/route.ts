// One hold, for the owner of its build.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { holdSchema } from '@/lib/schemas/builds'
import { readHold } from '@/lib/services/builds/release-hold'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'A hold of my build', response: holdSchema,
    handle: async ({ context, params }) => ({ body: await readHold(context, pathId(params), pathId(params, 'hold')) }),
  }),
})
