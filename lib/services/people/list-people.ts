// Everybody with an account, for stewards.
import 'server-only'
import { listMembers } from '@/db/queries/people'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'

export type ListedMember = Awaited<ReturnType<typeof listMembers>>[number]

/** By name. 403 for anybody but a steward. */
export async function listPeople(context: AppContext): Promise<ListedMember[]> {
  if (!can(context.actor, 'people.open')) throw refuse.forbidden(whyNot['people.open'])
  return listMembers(context.reader)
}
