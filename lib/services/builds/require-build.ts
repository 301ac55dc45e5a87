// What every service on a build begins with: the build, if it is the actor's own. To everybody else it is not there.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { getBuild } from '@/db/queries/builds'
import { getSection } from '@/db/queries/kits'
import { refuse } from '@/lib/errors'
import type { Actor } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'

export type OwnBuild = NonNullable<Awaited<ReturnType<typeof getBuild>>>

/** 404 for anybody but the owner, whatever their role, and for a build that is not there: the two look the same. */
export async function requireBuild(reader: ReaderOrTransaction, actor: Actor, id: number): Promise<OwnBuild> {
  const found = await getBuild(reader, id)
  if (!found || !can(actor, 'build.open', { ownerId: found.build.memberId })) throw refuse.notFound('This build')
  return found
}

/** A section of the build's kit by its code; 404 when the kit has none. */
export async function requireBuildSection(reader: ReaderOrTransaction, actor: Actor, id: number, code: string) {
  const found = await requireBuild(reader, actor, id)
  const placed = await getSection(reader, found.kit.slug, code)
  if (!placed) throw refuse.notFound('This section')
  return { ...found, section: placed.section }
}
