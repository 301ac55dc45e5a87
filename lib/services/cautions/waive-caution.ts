// A moderator waives a caution on one post, with a reason that stays readable beside it.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import { postCaution } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { judgePost } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Returns the entry it stood in. 404 when the post does not carry it; 409 when it was waived before. */
export async function waiveCaution(context: AppContext, postId: number, input: { code: string; reason: string }): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getCautionedPost(tx, postId)
    if (!found || !can(actor, 'post.read', subjectOf(found))) throw refuse.notFound('This post')
    if (!can(actor, 'post.set-cautions', subjectOf(found))) throw refuse.forbidden(whyNot['post.set-cautions'])
    const standing = found.cautions.find((c) => c.code === input.code)
    if (!standing) throw refuse.notFound('This caution')
    if (standing.waivedAt !== null) throw new AppError('conflict', 'This caution was waived before.')
    await tx.update(postCaution).set({ waivedAt: now, waivedBy: actor.id, waivedReason: input.reason })
      .where(and(eq(postCaution.postId, postId), eq(postCaution.code, input.code)))
    await judgePost(tx, postId)
    record('caution.waive', `post:${postId}`, input.code)
    return { entryId: found.parentId ?? postId }
  })
  await afterWrite(context)
  return done
}
