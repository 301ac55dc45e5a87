// One aeroplane, for its owner.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { buildSchema } from '@/lib/schemas/builds'
import { getBuild } from '@/lib/services/builds/get-build'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'One of my aeroplanes: sections with their state, open holds, what is left open on purpose, what I go by', response: buildSchema,
    handle: async ({ context, params }) => ({ body: await getBuild(context, pathId(params)) }),
  }),
})
