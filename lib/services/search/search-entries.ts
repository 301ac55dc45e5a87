// Look up: words and filters -> hits. Without words, the newest that fit the filters.
import 'server-only'
import { countEntries, listEntryIds } from '@/db/queries/entries'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { keyBalloons, type BalloonKeys } from '@/lib/domain/shop/key-balloons'
import { computeQuery } from '@/lib/services/shop/compute-query'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import type { AppContext } from '@/lib/context'
import type { Hit, SearchQuery, SearchResult } from '@/lib/schemas/search'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { filtersOf } from './filters-of'
import { loadHits, presentHits, type HitMaterial } from './present-hits'

/** Throws SearchLoadingError while the index loads. */
export async function searchEntries(context: AppContext, query: SearchQuery): Promise<SearchResult> {
  const startedAt = performance.now()
  const text = query.q.trim()
  const finding = text === '' ? findNewest(context, query) : findByWords(context, text, query, async () => (await computing).keys)
  // The tables are asked while the search thread looks the words up; a search that fails meanwhile is heard below.
  finding.catch(() => undefined)
  const measurements = findMeasurements(text)
  const computing = compute(context, text, query)
  const { computed } = await computing
  const { results, total, ignored, didYouMean } = await finding
  return {
    query: { text: query.q, ignored, measurements, ...(didYouMean !== null ? { didYouMean } : {}) },
    computed, results, total, tookMs: Math.round((performance.now() - startedAt) * 10) / 10,
  }
}

/** What the tables say, and which hits are about which of its balloons. */
async function compute(context: AppContext, text: string, query: SearchQuery): Promise<{ computed: ShopAnswer[]; keys: BalloonKeys | null }> {
  const computed = query.offset === 0 ? computeQuery(text, await limitsOf(context, query)) : []
  const [answer] = computed
  return { computed, keys: answer ? keyBalloons(answer.table, answer.balloons, answer.results) : null }
}

/** Without a kit nothing is read, nor waited for. */
const limitsOf = async ({ reader }: AppContext, { kit }: SearchQuery) => (kit === undefined ? {} : { kit, limits: await loadMakerLimits(reader, kit) })

interface Found { results: Hit[]; total: number; ignored: string[]; didYouMean: string | null }

async function findByWords(context: AppContext, text: string, query: SearchQuery, keys: () => Promise<BalloonKeys | null>): Promise<Found> {
  let loading: Promise<HitMaterial> | undefined
  const { hits, ...found } = await context.search.search({ text, filters: filtersOf(query), limit: query.limit, offset: query.offset }, (entryIds) => {
    loading = loadHits(context, entryIds)
    // Heard by presentHits, unless the search itself fails first.
    loading.catch(() => undefined)
  })
  return { ...found, results: await presentHits(context, hits, { loading, keys: await keys() }) }
}

async function findNewest(context: AppContext, query: SearchQuery): Promise<Found> {
  const ids = await listEntryIds(context.reader, filtersOf(query), { limit: query.limit, offset: query.offset })
  const results = await presentHits(context, ids.map((id) => ({ id, postId: id, score: 0, terms: [] })))
  return { results, total: await countEntries(context.reader, filtersOf(query)), ignored: [], didYouMean: null }
}
