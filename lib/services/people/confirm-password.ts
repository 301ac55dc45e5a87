// Asks for the password again before something that cannot be taken back. Tries are counted like sign-ins.
import 'server-only'
import { getMember } from '@/db/queries/people'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { authenticate } from './authenticate'

/** The member's row when the password is theirs; 422 on the field `currentPassword` when it is not; 429 after too many tries. */
export async function confirmPassword(context: AppContext, password: string) {
  if (!context.actor) throw refuse.signIn()
  const found = await getMember(context.reader, context.actor.id)
  if (!found || found.member.email === null) throw refuse.signIn()
  try {
    return await authenticate(context, { email: found.member.email, password, address: `member:${found.member.id}` })
  } catch (error) {
    if (error instanceof AppError && error.code === 'unauthenticated') throw refuse.invalid('currentPassword', 'This is not your present password.')
    throw error
  }
}
