// A section for its steward's pages: names, and whether this reader may change what stands there.
import 'server-only'
import { getSection } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'

export interface Place { kit: { slug: string; name: string; maker: string }; section: { code: string; title: string }; mayKeep: boolean }

/** 404 when there is no such section. */
export async function requirePlace(context: AppContext, kitSlug: string, code: string) {
  const found = await getSection(context.reader, kitSlug, code)
  if (!found) throw refuse.notFound('This section')
  const { slug, name, maker } = found.kit
  const place: Place = { kit: { slug, name, maker }, section: { code: found.section.code, title: found.section.title }, mayKeep: can(context.actor, 'kits.keep') }
  return { found, place }
}
