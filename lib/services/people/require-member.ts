// What the steward's services on a member share: the member as they are now, inside the transaction.
import 'server-only'
import type { Transaction } from '@/db/client'
import { getMember } from '@/db/queries/people'
import { refuse } from '@/lib/errors'

/** The member with a live mark; 404 when nobody is there any more, since a closed account takes no changes. */
export async function requireMember(tx: Transaction, memberId: number) {
  const found = await getMember(tx, memberId)
  if (!found || found.member.state === 'closed') throw refuse.notFound('This member')
  return found
}
