// The bulletins of a kit, the newest first.
import 'server-only'
import { getKit } from '@/db/queries/kits'
import { listBulletins } from '@/db/queries/plans'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'

/** 404 when there is no such kit. */
export async function getBulletins(context: AppContext, kitSlug: string) {
  const kit = await getKit(context.reader, kitSlug)
  if (!kit) throw refuse.notFound('This kit')
  return { kit: { slug: kit.slug, name: kit.name, maker: kit.maker }, mayKeep: can(context.actor, 'kits.keep'), bulletins: await listBulletins(context.reader, kit.id) }
}
