// Suspending a member and letting them back in. Their words and stamps stand; they are out on their next request.
import 'server-only'
import { createHash } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { keepingLastSteward } from './last-steward'
import { requireMember } from './require-member'

/** 403 as the policy says; 409 for the last steward; the same state again changes nothing. */
export async function setMemberState(context: AppContext, memberId: number, input: { state: 'active' | 'suspended'; reason: string }): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  await keepingLastSteward(() => write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await requireMember(tx, memberId)
    if (!can(actor, 'people.set-state', { memberId, role: found.member.role })) throw refuse.forbidden(whyNot['people.set-state'])
    if (found.member.state === input.state) return record('nothing', `member:${memberId}`)
    await tx.update(member).set({ state: input.state, stateReason: input.reason, stateBy: actor.id, stateAt: now }).where(eq(member.id, memberId))
    // The audit trail holds no text, so that people can leave: the reason's hash shows later which reason was given.
    record(input.state === 'suspended' ? 'member.suspend' : 'member.restore', `member:${memberId}`, createHash('sha256').update(input.reason).digest('hex'))
  }))
}
