// A member begins to keep an aeroplane.
import 'server-only'
import { insertBuild } from '@/db/mutations/builds'
import { getKit } from '@/db/queries/kits'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { NewBuild } from '@/lib/schemas/builds'

/** Returns its id. 422 when there is no such kit. */
export async function makeBuild({ database, actor, now }: AppContext, input: NewBuild): Promise<number> {
  if (!actor || !can(actor, 'builds.keep')) throw refuse.signIn()
  return write(database, { actorId: actor.id, at: now }, async (tx, record) => {
    const kit = await getKit(tx, input.kit)
    if (!kit) throw refuse.invalid('kit', 'There is no such kit here.')
    const id = await insertBuild(tx, { memberId: actor.id, kitId: kit.id, name: input.name, serial: input.serial, createdAt: now })
    record('build.make', `build:${id}`)
    return id
  })
}
