// A new password. It raises the session epoch: whoever is signed in elsewhere under the old one is out on their next request.
import 'server-only'
import { eq } from 'drizzle-orm'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import { hashPassword } from '@/lib/auth/password'
import type { AppContext } from '@/lib/context'
import type { ChangePassword } from '@/lib/schemas/people'
import { confirmPassword } from './confirm-password'

/** What the new session is made from. 422 when the present password is wrong. */
export async function changePassword(context: AppContext, input: ChangePassword): Promise<{ id: number; sessionEpoch: number }> {
  const { id, sessionEpoch } = await confirmPassword(context, input.currentPassword)
  const passwordHash = await hashPassword(input.newPassword)
  const next = { id, sessionEpoch: sessionEpoch + 1 }
  await write(context.database, { actorId: id, at: context.now }, async (tx, record) => {
    await tx.update(member).set({ passwordHash, sessionEpoch: next.sessionEpoch }).where(eq(member.id, id))
    record('member.change-password', `member:${id}`)
  })
  return next
}
