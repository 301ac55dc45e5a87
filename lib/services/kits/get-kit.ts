// One kit with its sections in plan order.
import 'server-only'
import { getKit as getKitRow } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Kit } from '@/lib/schemas/kits'

/** By slug; 404 when there is none. */
export async function getKit(context: AppContext, slug: string): Promise<Kit> {
  const found = await getKitRow(context.reader, slug)
  if (!found) throw refuse.notFound('This kit')
  return { slug: found.slug, name: found.name, maker: found.maker, sections: found.sections.map(({ code, title, position, jasc }) => ({ code, title, position, jasc })) }
}
