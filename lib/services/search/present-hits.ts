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
import type { Hit } from '@/lib/schemas/search'
import { judge } from '@/lib/services/posts/judge-post'
import { presentCautions, presentChanges, presentOutcomes, presentStamps } from '@/lib/services/posts/present-post'

interface Found { id: number; postId: number; score: number; terms: readonly string[] }

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
  const tasks = await listTasksBySlug(reader, [...new Set([...posts.values()].flatMap((p) => p.current.tasks))])
  return { answers, posts, tasks: new Map(tasks.map((t) => [t.slug, t.title])) }
}

/** Hits in the order given. Anything not visible any more is left out, whatever the index says. */
export async function presentHits(context: AppContext, found: readonly Found[], loading?: Promise<HitMaterial>): Promise<Hit[]> {
  const { answers, posts, tasks } = await (loading ?? loadHits(context, found.map((f) => f.id)))
  return found.flatMap((f) => {
    const entry = posts.get(f.id)
    const passage = posts.get(f.postId) ?? entry
    if (!entry || !passage || entry.state !== 'visible' || entry.kind === 'answer') return []
    const own = answers.flatMap((a) => (a.parentId === entry.id ? (posts.get(a.id) ?? []) : [])).filter((a) => a.state === 'visible')
    return [presentHit(f, entry, passage.state === 'visible' ? passage : entry, own, tasks)]
  })
}

function presentHit(found: Found, entry: CautionedPost, passage: CautionedPost, answers: readonly CautionedPost[], tasks: ReadonlyMap<string, string>): Hit {
  // A question shows the stamps of the advice under it: the passage's, or the best there is.
  const advice = passage.kind === 'question' ? (answers.find((a) => a.stampState === 'stamped') ?? answers.find((a) => a.stampState !== 'none') ?? null) : passage
  const plain = plainText(passage)
  const told = advice ?? passage
  return {
    id: entry.id, kind: entry.kind === 'lesson' ? 'lesson' : 'question', ...(entry.ref !== null ? { ref: entry.ref } : {}), title: entry.current.title, url: paths.entry(entry.id, passage.id),
    passage: { postId: passage.id, kind: passage.kind, author: passage.author.id === null ? { name: passage.author.name } : { id: passage.author.id, name: passage.author.name }, revision: revisionLetter(passage.current.number) },
    ...makeSnippet(plain, [...found.terms]), score: found.score, kit: entry.kit?.slug ?? '', sections: entry.current.sections, tasks: entry.current.tasks,
    partTags: [...entry.sections.map((s) => ({ code: s.code, title: s.title })), ...entry.current.tasks.map((slug) => ({ title: tasks.get(slug) ?? slug }))],
    stamp: advice?.stampState ?? 'none', stamps: advice ? presentStamps(advice, advice.kind === 'answer' ? entry.current.number : 0).filter((s) => s.withdrawn === undefined) : [],
    needsTwo: passage.needsTwo || entry.needsTwo, open: entry.kind === 'question' && answers.length === 0, answers: answers.length,
    outcomes: presentOutcomes(told), planChanges: presentChanges(judge(told, told.kind === 'answer' ? entry.current.number : 0).changes), cautions: unionCautions([presentCautions(entry), presentCautions(passage), ...(advice ? [presentCautions(advice)] : [])]),
  }
}

/** The text a snippet is cut from: what was rendered, or the Markdown while that is missing. */
function plainText(post: CautionedPost): string {
  return post.plain ?? textFields(post.kind, post.current.parts, post.current.body).map((f) => f.text).join('\n\n')
}
