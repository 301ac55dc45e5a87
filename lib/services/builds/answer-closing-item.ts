// A line of the closing list on one build: ticked with a note, or not done with its reason.
import 'server-only'
import { saveClosingAnswer } from '@/db/mutations/builds'
import { getClosingItem } from '@/db/queries/builds'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { requireBuild } from './require-build'

/** Replaces what was answered before; returns the section's code. 404 when the build's kit has no such line. */
export async function answerClosingItem({ database, actor, now }: AppContext, buildId: number, itemId: number, answer: { isDone: boolean; note: string }): Promise<string> {
  return write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { build } = await requireBuild(tx, actor, buildId)
    const found = await getClosingItem(tx, itemId)
    if (!found || found.section.kitId !== build.kitId) throw refuse.notFound('This line')
    await saveClosingAnswer(tx, { buildId, closingItemId: itemId, ...answer, at: now })
    record('closing.answer', `build:${buildId}`, `item:${itemId}`)
    return found.section.code
  })
}
