// One aeroplane: its sections in plan order, what is held and left open, what its owner goes by.
import 'server-only'
import type { AppContext } from '@/lib/context'
import type { Build } from '@/lib/schemas/builds'
import { listGoneBy } from './list-gone-by'
import { requireBuild } from './require-build'
import { summariseBuilds } from './summarise-builds'

/** 404 for everybody but its owner. */
export async function getBuild(context: AppContext, id: number): Promise<Build> {
  const found = await requireBuild(context.reader, context.actor, id)
  const [[summary], goingBy] = await Promise.all([summariseBuilds(context.reader, [found]), listGoneBy(context, found.build.memberId, { kitId: found.kit.id })])
  if (!summary) throw new Error('A build without its summary')
  return { ...summary, goingBy }
}
