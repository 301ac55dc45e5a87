// My aeroplanes: a member's own, and nobody else's.
import { endpoint, routes } from '@/lib/http/route'
import { paths } from '@/lib/paths'
import { z } from 'zod'
import { buildSchema, buildSummarySchema, newBuildSchema } from '@/lib/schemas/builds'
import { getBuild } from '@/lib/services/builds/get-build'
import { listBuilds } from '@/lib/services/builds/list-builds'
import { makeBuild } from '@/lib/services/builds/make-build'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'My aeroplanes', response: z.object({ items: z.array(buildSummarySchema) }),
    handle: async ({ context }) => ({ body: { items: await listBuilds(context) } }),
  }),
  POST: endpoint({
    summary: 'Begin to keep an aeroplane', body: newBuildSchema, response: buildSchema, status: 201,
    handle: async ({ context, body }) => {
      const id = await makeBuild(context, body)
      return { body: await getBuild(context, id), headers: { location: `/api${paths.build(id)}` } }
    },
  }),
})
