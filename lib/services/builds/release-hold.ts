// What a hold waited for has happened: it is released with a note, and stays to be read.
import 'server-only'
import { releaseHoldRow } from '@/db/mutations/builds'
import { getHold } from '@/db/queries/builds'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Hold } from '@/lib/schemas/builds'
import { presentHold } from './present-hold'
import { requireBuild } from './require-build'

/** Releasing it again changes nothing: the first note stays. 404 when the build has no such hold. */
export async function releaseHold({ database, actor, now }: AppContext, buildId: number, holdId: number, note: string): Promise<Hold> {
  return write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    await requireBuild(tx, actor, buildId)
    const before = await getHold(tx, { buildId, id: holdId })
    if (!before) throw refuse.notFound('This hold')
    if (before.hold.releasedAt !== null) {
      record('nothing', `build:${buildId}`)
      return presentHold(before)
    }
    await releaseHoldRow(tx, holdId, now, note)
    record('hold.release', `build:${buildId}`, `hold:${holdId}`)
    return presentHold({ ...before, hold: { ...before.hold, releasedAt: now, releaseNote: note } })
  })
}

/** 404 for everybody but the owner, and for a hold that the build does not have. */
export async function readHold({ reader, actor }: AppContext, buildId: number, holdId: number): Promise<Hold> {
  await requireBuild(reader, actor, buildId)
  const found = await getHold(reader, { buildId, id: holdId })
  if (!found) throw refuse.notFound('This hold')
  return presentHold(found)
}
