// Loads an entry with its answers and what is rendered of them, mending renderings that are missing or of an older renderer.
import 'server-only'
import { saveRendering } from '@/db/mutations/posts'
import { listAnswerIds, listCautionedPosts, remarkRenderingKey, renderingKey, type CautionedPost } from '@/db/queries/cautioned-post'
import { listRenderings } from '@/db/queries/renderings'
import { writeQuietly } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { textFields } from '@/lib/domain/entries/entry-text'
import { orderPosts } from '@/lib/domain/evidence/order-posts'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { parserVersion } from '@/lib/domain/measurements/measurement'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { rendererVersion } from '@/lib/render/markdown-to-html'
import type { Entry } from '@/lib/schemas/post'
import { presentAnswer, presentEntry, type RemarkRenderings } from './present-post'
import { renderText } from './render-text'
import { saveText } from './save-text'

/** The entry as the actor may see it, answers in their order; throws not-found when it is not there or not to be seen. */
export const loadEntry = async (context: AppContext, id: number): Promise<Entry> => (await loadEntryWithPosts(context, id)).entry

/** The same with what it was made of: the entry's own post first, then the answers that the actor may see, oldest first. */
export async function loadEntryWithPosts(context: AppContext, id: number): Promise<{ entry: Entry; posts: CautionedPost[] }> {
  const answerIds = (await listAnswerIds(context.reader, [id])).map((a) => a.id)
  const posts = await withRenderings(context, await listCautionedPosts(context.reader, [id, ...answerIds]))
  const [entry, ...answers] = posts
  if (!entry || entry.id !== id || entry.parentId !== null || !can(context.actor, 'post.read', subjectOf(entry))) throw refuse.notFound('This entry')
  const remarks = await remarkRenderings(context, posts)
  const seen = answers.filter((a) => can(context.actor, 'post.read', subjectOf(a)))
  const ordered = orderPosts(seen.map((a) => presentAnswer(a, entry, remarks)).map((answer) => ({
    answer, id: answer.id, stampState: answer.stamp, critical: answer.needsTwo, createdAt: Date.parse(answer.createdAt),
    asWritten: answer.outcomes.asWritten, withChange: answer.outcomes.withChange, didNotWork: answer.outcomes.didNotWork,
  }))).map((o) => o.answer)
  return { entry: presentEntry(entry, ordered, remarks), posts: [entry, ...seen] }
}

/** A post as the policy sees it. */
export const subjectOf = (found: CautionedPost) => ({ kind: found.kind, state: found.state, authorIds: found.authorIds, makerReply: found.current.makerReplyScope })

/** Posts whose HTML is there: a missing or outdated rendering is made now and kept. */
export async function withRenderings(context: Pick<AppContext, 'renderer' | 'database'>, posts: readonly CautionedPost[]): Promise<CautionedPost[]> {
  return Promise.all(posts.map(async (found) => {
    if (found.rendering && found.rendering.renderer === rendererVersion) return found
    const fields = textFields(found.kind, found.current.parts, found.current.body)
    const made = await renderText(context.renderer, fields)
    const { number } = found.current
    await writeQuietly(context.database, (tx) => saveText(tx, found.id, number, made))
    return { ...found, plain: made.plain, rendering: { key: renderingKey(found.id, number), ...made }, measuredBy: parserVersion, measurements: findMeasurements(made.plain) }
  }))
}

/** HTML of the remarks under these posts, by remark id. */
export async function remarkRenderings(context: AppContext, posts: readonly CautionedPost[]): Promise<RemarkRenderings> {
  const remarks = posts.flatMap((p) => p.remarks)
  const kept = new Map((await listRenderings(context.reader, remarks.map((r) => remarkRenderingKey(r.id)))).map((r) => [r.key, r]))
  const pairs = await Promise.all(remarks.map(async (r) => {
    const known = kept.get(remarkRenderingKey(r.id))
    if (known && known.renderer === rendererVersion) return [r.id, { html: known.html['body'] ?? '', plain: known.plain }] as const
    const made = { key: remarkRenderingKey(r.id), ...(await renderText(context.renderer, [{ name: 'body', text: r.body }])) }
    await writeQuietly(context.database, (tx) => saveRendering(tx, made))
    return [r.id, { html: made.html['body'] ?? '', plain: made.plain }] as const
  }))
  return new Map(pairs)
}
