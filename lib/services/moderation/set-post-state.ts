// A moderator hides a post or restores it (a merged one too), with a reason. Nothing is ever deleted.
import 'server-only'
import { eq } from 'drizzle-orm'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import { post } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { judgePost } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Returns the entry it belongs to. 409 for a post that is withdrawn, for hiding a merged one, and for one in that state already. */
export async function setPostState(context: AppContext, postId: number, input: { state: 'visible' | 'hidden'; reason: string }): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getCautionedPost(tx, postId)
    if (!found || !can(actor, 'post.read', subjectOf(found))) throw refuse.notFound('This post')
    if (!can(actor, 'post.hide', subjectOf(found))) throw refuse.forbidden(whyNot['post.hide'])
    const isOpen = found.state === 'visible' || found.state === 'hidden' || (found.state === 'merged' && input.state === 'visible')
    if (!isOpen || found.state === input.state) throw new AppError('conflict', `This post is ${found.state} already.`)
    await tx.update(post).set({ state: input.state, stateReason: input.reason, mergedIntoId: null, stateBy: actor.id, stateAt: now }).where(eq(post.id, postId))
    await judgePost(tx, postId)
    record(input.state === 'hidden' ? 'post.hide' : 'post.restore', `post:${postId}`)
    return { entryId: found.parentId ?? postId }
  })
  await afterWrite(context)
  return done
}
