// Look up: words and filters -> hits. Without words, the newest that fit the filters.
import 'server-only'
import { countEntries, listEntryIds } from '@/db/queries/entries'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { computeQuery } from '@/lib/services/shop/compute-query'
import type { AppContext } from '@/lib/context'
import type { SearchQuery, SearchResult } from '@/lib/schemas/search'
import { presentHits } from './present-hits'

/** Throws SearchLoadingError while the index loads. */
export async function searchEntries(context: AppContext, query: SearchQuery): Promise<SearchResult> {
  const startedAt = performance.now()
  const text = query.q.trim()
  const filters = { kit: query.kit, section: query.section, operation: query.operation, kind: query.kind, ...(query.stamped === '1' ? { stamped: true } : {}) }
  const answer = text === ''
    ? { hits: (await listEntryIds(context.reader, filters, { limit: query.limit, offset: query.offset })).map((id) => ({ id, postId: id, score: 0, terms: [] })), total: await countEntries(context.reader, filters), ignored: [], didYouMean: null }
    : await context.search.search({ text, filters, limit: query.limit, offset: query.offset })
  const results = await presentHits(context, answer.hits)
  return {
    query: { text: query.q, ignored: answer.ignored, measurements: findMeasurements(text), ...(answer.didYouMean !== null ? { didYouMean: answer.didYouMean } : {}) },
    computed: query.offset === 0 ? computeQuery(text) : [], results, total: answer.total, tookMs: Math.round((performance.now() - startedAt) * 10) / 10,
  }
}
