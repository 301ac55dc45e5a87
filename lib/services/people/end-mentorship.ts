// A steward ends somebody's mentorship, with a reason. Stamps that were pressed stay, with their mark.
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { mentorship } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { requireMember } from './require-member'

/** 403 as the policy says; 409 when there is none to end. */
export async function endMentorship(context: AppContext, memberId: number, input: { reason: string }): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'people.grant-mentorship', { memberId })) throw refuse.forbidden(whyNot['people.grant-mentorship'])
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    await requireMember(tx, memberId)
    const live = and(eq(mentorship.memberId, memberId), isNull(mentorship.endedAt))
    const [ended] = await tx.update(mentorship).set({ endedAt: now, endedBy: actor.id, endReason: input.reason }).where(live).returning({ id: mentorship.id })
    if (!ended) throw new AppError('conflict', 'This mentorship has ended already.')
    record('mentorship.end', `member:${memberId}`, `mentorship:${ended.id}`)
  })
}
