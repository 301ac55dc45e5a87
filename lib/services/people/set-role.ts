// A steward sets a member's step on the ladder of care. It holds from the member's next request on.
import 'server-only'
import { eq } from 'drizzle-orm'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Role } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { keepingLastSteward } from './last-steward'
import { requireMember } from './require-member'

/** 403 for anybody but a steward; 409 for the last steward; the same role again changes nothing. */
export async function setRole(context: AppContext, memberId: number, input: { role: Role }): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'people.set-role', { memberId })) throw refuse.forbidden(whyNot['people.set-role'])
  await keepingLastSteward(() => write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await requireMember(tx, memberId)
    if (found.member.role === input.role) return record('nothing', `member:${memberId}`)
    await tx.update(member).set({ role: input.role }).where(eq(member.id, memberId))
    record('member.set-role', `member:${memberId}`, input.role)
  }))
}
