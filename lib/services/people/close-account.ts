// A member leaves: name and address go, what they knew stays under "former member". Stamps keep their mark.
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { clearBuilds } from '@/db/mutations/builds'
import { attempt, idempotency, member, mentorship, token } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { confirmPassword } from './confirm-password'
import { keepingLastSteward } from './last-steward'

export const formerMember = 'former member'

/** 422 when the password is wrong; 409 for the last steward. */
export async function closeAccount(context: AppContext, input: { currentPassword: string }): Promise<void> {
  const { id, email } = await confirmPassword(context, input.currentPassword)
  const { now } = context
  await keepingLastSteward(() => write(context.database, { actorId: id, at: now }, async (tx, record) => {
    await tx.update(member).set({ name: formerMember, email: null, passwordHash: null, bio: '', units: null, role: 'member', state: 'closed' }).where(eq(member.id, id))
    await tx.update(token).set({ revokedAt: now }).where(and(eq(token.memberId, id), isNull(token.revokedAt)))
    await tx.update(mentorship).set({ endedAt: now, endedBy: id, endReason: 'The account was closed.' }).where(and(eq(mentorship.memberId, id), isNull(mentorship.endedAt)))
    // What was said of the person goes with them; number and dates stay, since stamps point at them.
    await tx.update(mentorship).set({ fields: '', reason: '' }).where(eq(mentorship.memberId, id))
    await clearBuilds(tx, id, now)
    await tx.delete(idempotency).where(eq(idempotency.memberId, id))
    if (email !== null) await tx.delete(attempt).where(eq(attempt.key, `email:${email}`))
    record('member.close', `member:${id}`)
  }))
}
