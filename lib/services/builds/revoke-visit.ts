// The owner closes a visit's link: from then on it opens nothing.
import 'server-only'
import { endVisit } from '@/db/mutations/visits'
import { getVisit } from '@/db/queries/visits'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { requireBuild } from './require-build'

/** Revoking it twice is once. 404 when the build has no such visit. */
export async function revokeVisit({ database, actor, now }: AppContext, buildId: number, visitId: number): Promise<void> {
  await write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    await requireBuild(tx, actor, buildId)
    const found = await getVisit(tx, buildId, visitId)
    if (!found) throw refuse.notFound('This visit')
    if (found.revokedAt !== null) return record('nothing', `build:${buildId}`)
    await endVisit(tx, visitId, now)
    record('visit.revoke', `build:${buildId}`, `visit:${visitId}`)
  })
}
