// A steward grants mentorship to somebody else: with a number for the stamp, fields and a reason. It is never climbed.
import 'server-only'
import { eq } from 'drizzle-orm'
import { mentorship } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { requireMember } from './require-member'

/** 403 as the policy says; 409 for a mentor already; 422 for a number that was given before, also to somebody who left. */
export async function grantMentorship(context: AppContext, memberId: number, input: { number: string; fields: string; reason: string }): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'people.grant-mentorship', { memberId })) throw refuse.forbidden(whyNot['people.grant-mentorship'])
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await requireMember(tx, memberId)
    if (found.member.state !== 'active') throw new AppError('conflict', 'Somebody who is suspended cannot become a mentor.')
    if (found.mark !== null) throw new AppError('conflict', `${found.member.name} is a mentor already, with the number ${found.mark}.`)
    const [taken] = await tx.select({ id: mentorship.id }).from(mentorship).where(eq(mentorship.number, input.number))
    if (taken) throw refuse.invalid('number', 'This number was given before. A number is never given twice.')
    const [made] = await tx.insert(mentorship).values({ memberId, ...input, grantedBy: actor.id, createdAt: now }).returning({ id: mentorship.id })
    if (!made) throw new Error('The mentorship was not inserted')
    record('mentorship.grant', `member:${memberId}`, `mentorship:${made.id}`)
  })
}
