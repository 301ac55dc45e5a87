// What completes the words being typed.
import { z } from 'zod'
import { endpoint, routes } from '@/lib/http/route'
import { suggestionSchema, suggestQuerySchema } from '@/lib/schemas/search'
import { suggest } from '@/lib/services/search/suggest'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'Up to eight completions of what is being typed', query: suggestQuerySchema, response: z.object({ items: z.array(suggestionSchema) }),
    handle: async ({ context, query }) => ({ body: { items: await suggest(context, query.q) } }),
  }),
})
