// A mentor stamps a revision with a basis. A mentor who looks again while it is in question, or after a bulletin, renews their own stamp.
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { askedFor, stamp } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { revisionLetter, revisionNumber } from '@/lib/domain/entries/revision-letter'
import { changeUnknownTo, isLive, plansChanges } from '@/lib/domain/stamps/stamp-state'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { NewStamp } from '@/lib/schemas/acts'
import { advisedConflicts } from '@/lib/domain/numbers-check/advised-conflicts'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { checkPostNumbers } from '@/lib/services/posts/check-post-numbers'
import { judge, judgePost } from '@/lib/services/posts/judge-post'
import { requirePost } from '@/lib/services/posts/require-post'
import { afterWrite } from '@/lib/services/posts/after-write'

/**
 * Returns the stamp's id. 403 own words, no mentor, or a reply for one serial; 422 for a text that conflicts with a shop table without a
 * reason; 409 when `revision` is not the current one,
 * or this mentor's stamp stands on it already.
 */
export async function pressStamp(context: AppContext, postId: number, input: NewStamp): Promise<{ id: number; entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const made = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { found, question, entryId, subject } = await requirePost(tx, actor, postId)
    if (!can(actor, 'post.stamp', subject) || actor.mark === null) throw refuse.forbidden(whyNot['post.stamp'])
    const questionRevision = question?.current.number ?? 0
    if (revisionNumber(input.revision) !== found.current.number) {
      const current = { id: postId, revision: revisionLetter(found.current.number) }
      throw new AppError('conflict', `This is Rev ${current.revision} now. Read it again before you stamp it.`, { current })
    }
    const [conflict] = advisedConflicts(checkPostNumbers(found, question, await loadMakerLimits(tx, (question ?? found).kit?.slug)))
    if (conflict && input.conflictReason === undefined) {
      throw refuse.invalid('conflictReason', `“${conflict.claim}” differs from the shop table${conflict.expected ? ` (${conflict.expected})` : ''}. Write why it is right all the same, or ask its author.`)
    }
    const own = found.stamps.find((s) => s.mentorId === actor.id && isLive(s, { currentRevision: found.current.number, questionRevision }))
    const changes = plansChanges({ currentRevision: found.current.number, questionRevision, plans: found.plans, bulletins: found.bulletins, stamps: found.stamps })
    const change = own ? changeUnknownTo(own, changes) : null
    const isInQuestion = judge(found, questionRevision).state === 'in-question'
    if (own && !change && !isInQuestion) throw new AppError('conflict', 'Your stamp stands on this revision already.', { current: { id: postId, revision: input.revision } })
    if (own) await tx.update(stamp).set({ withdrawnAt: now, withdrawnReason: isInQuestion || !change ? 'Looked at again after a report that it did not work.' : `Looked at again after bulletin ${change.bulletin}.` }).where(eq(stamp.id, own.id))
    const [row] = await tx.insert(stamp).values({
      postId, revision: found.current.number, questionRevision, mentorId: actor.id, mark: actor.mark, basis: input.basis, reference: input.reference,
      plansRevision: input.plansRevision ?? null, scope: input.scope ?? null, conflictReason: input.conflictReason ?? null, createdAt: now,
    }).returning({ id: stamp.id })
    if (!row) throw new Error('The stamp was not inserted')
    await tx.update(askedFor).set({ answeredAt: now }).where(and(eq(askedFor.postId, postId), isNull(askedFor.answeredAt)))
    await judgePost(tx, postId)
    record('stamp.press', `stamp:${row.id}`, `post:${postId} ${input.revision}`)
    return { id: row.id, entryId }
  })
  await afterWrite(context)
  return made
}
