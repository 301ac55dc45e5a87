// Entry ids and passages from the search door -> hits, read from the database with a fixed number of queries.
import 'server-only'
import { listAnswerIds, listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import { listTasksBySlug } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { makeSnippet } from '@/lib/domain/search/snippet'
import { paths } from '@/lib/paths'
import type { BalloonKeys } from '@/lib/domain/shop/key-balloons'
import type { Hit } from '@/lib/schemas/search'
import type { AdviceFound } from '@/lib/search/messages'
import { presentCautions, presentOutcomes, presentStamps } from '@/lib/services/posts/present-post'

interface Found { id: number; postId: number; score: number; terms: readonly string[]; advice?: readonly AdviceFound[] }

/** What hits are made of: the entries, every answer under them, and the names of their tasks. */
export interface HitMaterial {
  answers: readonly { id: number; parentId: number | null }[]
  posts: ReadonlyMap<number, CautionedPost>
  tasks: ReadonlyMap<string, string>
}

/** Reads what the hits of these entries need. Search does it while its thread still picks the passages. */
export async function loadHits({ reader }: AppContext, entryIds: readonly number[]): Promise<HitMaterial> {
  const answers = await listAnswerIds(reader, entryIds)
  const posts = new Map((await listCautionedPosts(reader, [...new Set([...entryIds, ...answers.map((a) => a.id)])], 'plain')).map((p) => [p.id, p]))
  const tasks = await listTasksBySlug(reader, [...new Set([...posts.values()].flatMap((p) => [...p.current.tasks, ...p.current.orderAdvice.flatMap((o) => [o.before, o.after])]))])
  return { answers, posts, tasks: new Map(tasks.map((t) => [t.slug, t.title])) }
}

/** Hits in the order given, keyed to the balloons of a computed answer where there is one. Anything not visible any more is left out, whatever the index says. */
export async function presentHits(context: AppContext, found: readonly Found[], { loading, keys = null }: { loading?: Promise<HitMaterial> | undefined; keys?: BalloonKeys | null } = {}): Promise<Hit[]> {
  const { answers, posts, tasks } = await (loading ?? loadHits(context, found.map((f) => f.id)))
  return found.flatMap((f) => {
    const entry = posts.get(f.id)
    const passage = posts.get(f.postId) ?? entry
    if (!entry || !passage || entry.state !== 'visible' || entry.kind === 'answer') return []
    const own = answers.flatMap((a) => (a.parentId === entry.id ? (posts.get(a.id) ?? []) : [])).filter((a) => a.state === 'visible')
    return [presentHit(f, entry, passage.state === 'visible' ? passage : entry, own, { tasks, keys })]
  })
}

function presentHit(found: Found, entry: CautionedPost, passage: CautionedPost, answers: readonly CautionedPost[], { tasks, keys }: { tasks: HitMaterial['tasks']; keys: BalloonKeys | null }): Hit {
  // A question shows the stamps of the advice under it: the passage's, or the best there is.
  const advice = passage.kind === 'question' ? (answers.find((a) => a.stampState === 'stamped') ?? answers.find((a) => a.stampState !== 'none') ?? null) : passage
  const plain = plainText(passage)
  const ordered = orderAdviceOf(found, [entry, ...answers], tasks)
  return {
    id: entry.id, kind: entry.kind === 'lesson' ? 'lesson' : 'question', ...(entry.ref !== null ? { ref: entry.ref } : {}), title: entry.current.title, url: paths.entry(entry.id, passage.id),
    passage: { postId: passage.id, kind: passage.kind, author: passage.author.id === null ? { name: passage.author.name } : { id: passage.author.id, name: passage.author.name }, revision: revisionLetter(passage.current.number) },
    ...makeSnippet(plain, [...found.terms]), score: found.score, kit: entry.kit?.slug ?? '', sections: entry.current.sections, tasks: entry.current.tasks,
    partTags: [...entry.sections.map((s) => ({ code: s.code, title: s.title })), ...entry.current.tasks.map((slug) => ({ title: tasks.get(slug) ?? slug }))],
    stamp: advice?.stampState ?? 'none', stamps: advice ? presentStamps(advice, advice.kind === 'answer' ? entry.current.number : 0).filter((s) => s.withdrawn === undefined) : [],
    ...(ordered.advice.length > 0 ? { orderAdvice: ordered.advice } : {}), needsTwo: passage.needsTwo || entry.needsTwo, open: entry.kind === 'question' && answers.length === 0, answers: answers.length,
    outcomes: presentOutcomes(advice ?? passage), cautions: unionCautions([presentCautions(entry), presentCautions(passage), ...(advice ? [presentCautions(advice)] : []), ...ordered.posts.map(presentCautions)]),
    balloons: keys?.(entry.current.title, plain) ?? [],
  }
}

/** The order advice that was found, as far as it still stands in a post that is visible, and the posts it is shown from: their cautions come along. */
function orderAdviceOf({ advice = [] }: Found, posts: readonly CautionedPost[], tasks: ReadonlyMap<string, string>): { advice: NonNullable<Hit['orderAdvice']>; posts: CautionedPost[] } {
  const title = (slug: string) => tasks.get(slug) ?? slug
  const standing = advice.flatMap(({ postId, before, after }) => {
    const post = posts.find((p) => p.id === postId && p.current.orderAdvice.some((o) => o.before === before && o.after === after))
    return post ? [{ post, shown: { postId, before: title(before), after: title(after) } }] : []
  })
  return { advice: standing.map(({ shown }) => shown), posts: [...new Set(standing.map(({ post }) => post))] }
}

/** The text a snippet is cut from: what was rendered, or the Markdown while that is missing. */
function plainText(post: CautionedPost): string {
  return post.plain ?? textFields(post.kind, post.current.parts, post.current.body).map((f) => f.text).join('\n\n')
}
