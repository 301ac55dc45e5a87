// A member's own aeroplanes.
import 'server-only'
import { listBuilds as listRows } from '@/db/queries/builds'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { BuildSummary } from '@/lib/schemas/builds'
import { summariseBuilds } from './summarise-builds'

/** Oldest first. 401 for a visitor, who has none. */
export async function listBuilds({ reader, actor }: AppContext): Promise<BuildSummary[]> {
  if (!actor || !can(actor, 'builds.keep')) throw refuse.signIn()
  const summaries = await summariseBuilds(reader, await listRows(reader, actor.id))
  return summaries.map(({ sections: _sections, holds: _holds, leftOpen: _left, ...summary }) => summary)
}
