// What a member's own account page shows.
import 'server-only'
import { getMember, listTokens } from '@/db/queries/people'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { UnitsChoice } from '@/lib/format/units-choice'

export interface Account {
  id: number
  name: string
  email: string
  bio: string
  mark: string | null
  units: UnitsChoice
  tokens: { id: number; name: string; createdAt: number }[]
}

/** The actor's own account with the tokens that still open something. 401 for a visitor. */
export async function getAccount(context: AppContext): Promise<Account> {
  if (!context.actor) throw refuse.signIn()
  const [found, tokens] = await Promise.all([getMember(context.reader, context.actor.id), listTokens(context.reader, context.actor.id)])
  if (!found) throw refuse.signIn()
  const { id, name, email, bio, units } = found.member
  return { id, name, email: email ?? '', bio, mark: found.mark, units: units ?? 'written', tokens: tokens.filter((t) => t.revokedAt === null).map((t) => ({ id: t.id, name: t.name, createdAt: t.createdAt })) }
}
