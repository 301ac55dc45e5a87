// Why the hits of a search stand where they stand, for stewards. The index explains itself; here its numbers get titles, cautions and names.
import 'server-only'
import { listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import { listTasksBySlug } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { weighEvidence } from '@/lib/domain/search/evidence-weight'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { SearchQuery } from '@/lib/schemas/search'
import type { ExplainedHit, SearchExplanation } from '@/lib/schemas/search-explanation'
import { evidenceFactOf } from '@/lib/search/build-document'
import type { ExplainedHit as FoundHit, SearchExplanation as Found } from '@/lib/search/explanation'
import { filtersOf } from './filters-of'
import { presentHits } from './present-hits'

/** Throws SearchLoadingError while the index loads. */
export async function explainSearch(context: AppContext, query: SearchQuery): Promise<SearchExplanation> {
  const { actor, reader } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'search.explain')) throw refuse.forbidden(whyNot['search.explain'])
  const found = await context.search.explain({ text: query.q.trim(), filters: filtersOf(query), limit: query.limit, offset: query.offset })
  const hits = new Map((await presentHits(context, found.hits.map((hit) => ({ ...hit, postId: hit.evidenceOf, terms: [] })))).map((hit) => [hit.id, hit]))
  const posts = new Map((await listCautionedPosts(reader, found.hits.map((hit) => hit.evidenceOf), 'plain')).map((post) => [post.id, post]))
  const { documents, least, best, cutBelow, considered, cut, total } = found
  return {
    query: await presentQuery(context, found), documents, least, best, cutBelow, considered, cut, total,
    hits: found.hits.flatMap((why): ExplainedHit[] => {
      const [hit, post] = [hits.get(why.id), posts.get(why.evidenceOf)]
      return hit && post ? [{ ...pick(why), hit, evidence: { ...presentEvidence(post), factor: why.evidence } }] : []
    }),
  }
}

async function presentQuery({ reader }: AppContext, { concepts, ignored, didYouMean, order, places }: Found): Promise<SearchExplanation['query']> {
  const titles = order ? new Map((await listTasksBySlug(reader, [...order.one, ...order.other])).map((task) => [task.slug, task.title])) : new Map<string, string>()
  const named = (slugs: readonly string[]) => slugs.map((slug) => titles.get(slug) ?? slug)
  return { concepts, ignored, didYouMean, order: order && { one: named(order.one), other: named(order.other) }, places }
}

const pick = ({ coverage, holds, terms, text, directness, advises, place, shared, score }: FoundHit) => ({ coverage, holds, terms, text, directness, advises, place, shared, score })

function presentEvidence(post: CautionedPost): Omit<ExplainedHit['evidence'], 'factor'> {
  const { stampState, critical, asWritten, withChange, didNotWork } = evidenceFactOf(post)
  const { ofState, ofOutcomes } = weighEvidence({ stampState, critical, asWritten, withChange, didNotWork })
  return { postId: post.id, kind: post.kind, stamp: stampState, critical, asWritten, withChange, didNotWork, ofStamp: ofState, ofOutcomes }
}
