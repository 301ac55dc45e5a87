// The section a steward keeps lists of, inside the transaction that writes them.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { getSection } from '@/db/queries/kits'
import { refuse } from '@/lib/errors'
import type { Actor, Member } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'

/** Whoever keeps kits. 401 for a visitor, 403 for others. */
export function requireKeeper(actor: Actor): Member {
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'kits.keep')) throw refuse.forbidden(whyNot['kits.keep'])
  return actor
}

/** The section by its kit and code; 404 when it is not there. */
export async function requireSection(reader: ReaderOrTransaction, place: { kit: string; section: string }) {
  const found = await getSection(reader, place.kit, place.section)
  if (!found) throw refuse.notFound('This section')
  return found.section
}
