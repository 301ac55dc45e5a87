// A small fixed corpus in the index, for tests of what is found and in which order.
import { SearchIndex } from '@/lib/search/search-index'
import type { SearchDocument, SearchFilters } from '@/lib/search/messages'
import type { SynonymList } from '@/lib/domain/search/synonyms'

const synonyms: SynonymList = {
  twoWay: [['nut plate', 'nutplate', 'anchor nut'], ['grommet', 'rubber bush']],
  oneWay: [{ from: 'ear muffs', to: ['hearing protection'] }],
}

/** A lesson about nothing in particular; a test spells out what it is about. */
export function aDocument(document: Partial<SearchDocument> & { id: number }, text = ''): SearchDocument {
  return {
    kind: 'lesson', kit: 'whimbrel-2', sections: ['W-3'], operations: ['drill'], tasks: [], stamped: false, open: false, createdAt: document.id,
    title: '', labels: '', passages: [{ postId: document.id, text, weight: 1 }], ...document,
  }
}

export function indexOf(...documents: SearchDocument[]): SearchIndex {
  const index = new SearchIndex(synonyms)
  for (const document of documents) index.put(document)
  return index
}

export const ask = (index: SearchIndex, text: string, filters: SearchFilters = {}, page: { limit?: number; offset?: number } = {}) =>
  index.search({ text, filters, limit: 20, offset: 0, ...page })

export const idsFor = (index: SearchIndex, text: string, filters?: SearchFilters) => ask(index, text, filters).hits.map((hit) => hit.id)
