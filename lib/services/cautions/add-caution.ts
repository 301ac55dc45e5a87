// A moderator adds a caution that the rules did not ask for. Added to a question, it goes onto its answers too.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { getCautionedPost, listAnswerIds } from '@/db/queries/cautioned-post'
import { postCaution } from '@/db/schema'
import { write } from '@/db/transaction'
import { cautionTable } from '@/lib/content/caution-table'
import type { AppContext } from '@/lib/context'
import type { CautionDefinition } from '@/lib/domain/cautions/rule-table'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { attachCautions } from '@/lib/services/posts/attach-cautions'
import { judgePost } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Returns the entry it stands in. 409 when it stands already; one that was waived is required again. 422 for an unknown code. */
export async function addCaution(context: AppContext, postId: number, input: { code: string; because: string }): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const definition = cautionTable.cautions.find((c) => c.code === input.code)
  if (!definition) throw refuse.invalid('code', 'There is no such caution.')
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getCautionedPost(tx, postId)
    if (!found || !can(actor, 'post.read', subjectOf(found))) throw refuse.notFound('This post')
    if (!can(actor, 'post.set-cautions', subjectOf(found))) throw refuse.forbidden(whyNot['post.set-cautions'])
    const standing = found.cautions.find((c) => c.code === input.code)
    if (standing && standing.waivedAt === null) throw new AppError('conflict', `${definition.title} stands on this post already.`)
    if (standing) await requireAgain(tx, postId, input, actor.id)
    else await tx.insert(postCaution).values({ postId, ...input, origin: 'moderator', addedBy: actor.id, createdAt: now })
    await judgePost(tx, postId)
    if (found.kind === 'question') await passOn(tx, postId, { ...definition, because: input.because }, now)
    record('caution.add', `post:${postId}`, input.code)
    return { entryId: found.parentId ?? postId }
  })
  await afterWrite(context)
  return done
}

async function requireAgain(tx: Transaction, postId: number, input: { code: string; because: string }, addedBy: number): Promise<void> {
  await tx.update(postCaution).set({ origin: 'moderator', because: input.because, addedBy, waivedAt: null, waivedBy: null, waivedReason: null })
    .where(and(eq(postCaution.postId, postId), eq(postCaution.code, input.code)))
}

/** An answer takes its question's. What was waived on an answer stays waived: waiving is decided post by post. */
async function passOn(tx: Transaction, questionId: number, caution: CautionDefinition & { because: string }, now: number): Promise<void> {
  for (const { id } of await listAnswerIds(tx, [questionId])) {
    if ((await attachCautions(tx, id, [caution], 'added-later', now)) > 0) await judgePost(tx, id)
  }
}
