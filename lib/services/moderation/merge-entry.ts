// A moderator merges a duplicate into the entry that stays: its address leads there, its text no longer stands as advice.
import 'server-only'
import { eq } from 'drizzle-orm'
import { getCautionedPost, listAnswerIds, listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import type { Transaction } from '@/db/client'
import { post } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { afterWrite } from '@/lib/services/posts/after-write'
import { judgePost } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'

/**
 * Returns the entry that stays. 404 for what is no entry, 409 for one that does not stand, 422 for a target that cannot stay
 * or a question whose answers would be lost: then the other one is merged into it.
 */
export async function mergeEntry(context: AppContext, entryId: number, { into, reason }: { into: number; reason: string }): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getCautionedPost(tx, entryId)
    if (!found || found.kind === 'answer' || !can(actor, 'post.read', subjectOf(found))) throw refuse.notFound('This entry')
    if (!can(actor, 'post.hide', subjectOf(found))) throw refuse.forbidden(whyNot['post.hide'])
    if (found.state !== 'visible') throw new AppError('conflict', `This entry is ${found.state} already.`)
    await refuseTarget(tx, found, into)
    await tx.update(post).set({ state: 'merged', stateReason: reason, mergedIntoId: into, stateBy: actor.id, stateAt: now }).where(eq(post.id, entryId))
    // What led here before leads on, so that no address ends at an entry that is not shown.
    await tx.update(post).set({ mergedIntoId: into }).where(eq(post.mergedIntoId, entryId))
    await judgePost(tx, entryId)
    record('post.merge', `post:${entryId}`, `into post:${into}`)
  })
  await afterWrite(context)
  return { entryId: into }
}

async function refuseTarget(tx: Transaction, found: CautionedPost, into: number): Promise<void> {
  const target = into === found.id ? null : await getCautionedPost(tx, into)
  if (!target || target.state !== 'visible' || target.kind !== found.kind) throw refuse.invalid('into', `Choose another ${found.kind} that stands.`)
  const answers = await listCautionedPosts(tx, (await listAnswerIds(tx, [found.id])).map((a) => a.id), 'plain')
  if (answers.some((a) => a.state === 'visible')) throw refuse.invalid('into', 'This question has answers, which would be lost. Merge the other one into it.')
}
