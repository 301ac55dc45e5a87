// Look up: words and filters -> hits. Without words, the newest that fit the filters.
import 'server-only'
import { countEntries, listEntryIds } from '@/db/queries/entries'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { keyBalloons, type BalloonKeys } from '@/lib/domain/shop/key-balloons'
import { computeQuery } from '@/lib/services/shop/compute-query'
import type { AppContext } from '@/lib/context'
import type { Hit, SearchQuery, SearchResult } from '@/lib/schemas/search'
import { loadHits, presentHits, type HitMaterial } from './present-hits'

/** Throws SearchLoadingError while the index loads. */
export async function searchEntries(context: AppContext, query: SearchQuery): Promise<SearchResult> {
  const startedAt = performance.now()
  const text = query.q.trim()
  let keys: BalloonKeys | null = null
  const finding = text === '' ? findNewest(context, query) : findByWords(context, text, query, () => keys)
  // The tables are asked while the search thread looks the words up; a search that fails meanwhile is heard below.
  finding.catch(() => undefined)
  const [measurements, computed] = [findMeasurements(text), query.offset === 0 ? computeQuery(text) : []]
  const [answer] = computed
  if (answer) keys = keyBalloons(answer.table, answer.balloons, answer.results)
  const { results, total, ignored, didYouMean } = await finding
  return {
    query: { text: query.q, ignored, measurements, ...(didYouMean !== null ? { didYouMean } : {}) },
    computed, results, total, tookMs: Math.round((performance.now() - startedAt) * 10) / 10,
  }
}

interface Found { results: Hit[]; total: number; ignored: string[]; didYouMean: string | null }

async function findByWords(context: AppContext, text: string, query: SearchQuery, keys: () => BalloonKeys | null): Promise<Found> {
  let loading: Promise<HitMaterial> | undefined
  const { hits, ...found } = await context.search.search({ text, filters: filtersOf(query), limit: query.limit, offset: query.offset }, (entryIds) => {
    loading = loadHits(context, entryIds)
    // Heard by presentHits, unless the search itself fails first.
    loading.catch(() => undefined)
  })
  return { ...found, results: await presentHits(context, hits, { loading, keys: keys() }) }
}

async function findNewest(context: AppContext, query: SearchQuery): Promise<Found> {
  const ids = await listEntryIds(context.reader, filtersOf(query), { limit: query.limit, offset: query.offset })
  const results = await presentHits(context, ids.map((id) => ({ id, postId: id, score: 0, terms: [] })))
  return { results, total: await countEntries(context.reader, filtersOf(query)), ignored: [], didYouMean: null }
}

const filtersOf = ({ kit, section, operation, kind, stamped }: SearchQuery) => ({ kit, section, operation, kind, ...(stamped === '1' ? { stamped: true } : {}) })
