// Posts that may already answer what somebody is writing. Reads only.
import { z } from 'zod'
import { endpoint, routes } from '@/lib/http/route'
import { hitSchema, similarInputSchema } from '@/lib/schemas/search'
import { findSimilar } from '@/lib/services/search/find-similar'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Entries that may already answer this text', isRead: true, body: similarInputSchema, response: z.object({ results: z.array(hitSchema) }),
    handle: async ({ context, body }) => ({ body: { results: await findSimilar(context, body) } }),
  }),
})
