// A new member. The first one of an installation without a steward looks after it.
import 'server-only'
import { countActiveStewards, getMemberByEmail } from '@/db/queries/people'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import { hashPassword } from '@/lib/auth/password'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { SignUp } from '@/lib/schemas/people'

/** Words for an installation that does not let everybody in. */
export const signUpClosed = 'This group takes new members by invitation. Ask a steward of the group: they open sign-up for you.'

/** The new member, to be signed in. 403 while sign-up is closed; 422 for an e-mail that has an account. */
export async function signUp(context: AppContext, input: Omit<SignUp, 'from'>, isOpen: boolean): Promise<{ id: number; sessionEpoch: number }> {
  if (!isOpen) throw refuse.forbidden(signUpClosed)
  // Before the transaction: hashing takes tens of milliseconds and would hold every other write.
  const passwordHash = await hashPassword(input.password)
  return write(context.database, { actorId: null, at: context.now }, async (tx, record) => {
    if (await getMemberByEmail(tx, input.email)) throw refuse.invalid('email', 'This e-mail has an account already. Sign in with it.')
    const role = (await countActiveStewards(tx)) === 0 ? 'steward' as const : 'member' as const
    const [made] = await tx.insert(member).values({ name: input.name, email: input.email, passwordHash, role, createdAt: context.now })
      .returning({ id: member.id, sessionEpoch: member.sessionEpoch })
    if (!made) throw new Error('The member was not inserted')
    record('member.sign-up', `member:${made.id}`)
    if (role === 'steward') record('member.set-role', `member:${made.id}`, 'steward')
    return made
  })
}
