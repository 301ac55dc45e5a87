// Look up: words and filters to hits.
import { endpoint, routes } from '@/lib/http/route'
import { searchQuerySchema, searchResultSchema } from '@/lib/schemas/search'
import { searchEntries } from '@/lib/services/search/search-entries'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'Look up entries by words and filters', query: searchQuerySchema, response: searchResultSchema,
    handle: async ({ context, query }) => ({ body: await searchEntries(context, query) }),
  }),
})
