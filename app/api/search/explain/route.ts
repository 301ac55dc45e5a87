// Why the hits of a search stand where they stand, for stewards.
import { endpoint, routes } from '@/lib/http/route'
import { searchQuerySchema } from '@/lib/schemas/search'
import { searchExplanationSchema } from '@/lib/schemas/search-explanation'
import { explainSearch } from '@/lib/services/search/explain-search'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'Why the hits of a search stand where they stand, for stewards', query: searchQuerySchema, response: searchExplanationSchema,
    handle: async ({ context, query }) => ({ body: await explainSearch(context, query) }),
  }),
})
