// A short note under a post. It shows its post's cautions and what its own words require.
import 'server-only'
import { saveRendering } from '@/db/mutations/posts'
import { remarkRenderingKey } from '@/db/queries/cautioned-post'
import { remark } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { answerRequests } from '@/lib/services/posts/answer-requests'
import { requirePost } from '@/lib/services/posts/require-post'
import { renderText } from '@/lib/services/posts/render-text'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Publishes and returns the remark's id and the entry it stands on. */
export async function addRemark(context: AppContext, postId: number, input: { body: string }): Promise<{ id: number; entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const rendered = await renderText(context.renderer, [{ name: 'body', text: input.body }])
  const made = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { entryId, subject } = await requirePost(tx, actor, postId)
    if (!can(actor, 'post.remark', subject)) throw refuse.forbidden(whyNot['post.remark'])
    const [row] = await tx.insert(remark).values({ postId, authorId: actor.id, body: input.body, createdAt: now }).returning({ id: remark.id })
    if (!row) throw new Error('The remark was not inserted')
    await saveRendering(tx, { key: remarkRenderingKey(row.id), ...rendered })
    await answerRequests(tx, postId, actor.id, now)
    record('remark.publish', `remark:${row.id}`, `post:${postId}`)
    return { id: row.id, entryId }
  })
  await afterWrite(context)
  return made
}
