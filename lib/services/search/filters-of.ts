// From a checked query to the filters of the index.
import 'server-only'
import type { SearchQuery } from '@/lib/schemas/search'
import type { SearchFilters } from '@/lib/search/messages'

export const filtersOf = ({ kit, section, operation, kind, stamped }: SearchQuery): SearchFilters =>
  ({ kit, section, operation, kind, ...(stamped === '1' ? { stamped: true } : {}) })
