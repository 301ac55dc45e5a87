// How much waits for whoever reads: the number in the navigation.
import 'server-only'
import { countOpenNotices } from '@/db/queries/notices'
import type { Actor } from '@/lib/policy/actor'
import { runtime } from '@/lib/runtime'

/** 0 for a visitor. Takes the actor, not a context: the house around every page asks, also where a page has none. */
export async function countNotices(actor: Actor): Promise<number> {
  if (!actor) return 0
  const { database } = await runtime()
  return countOpenNotices(database.reader, actor.id)
}
