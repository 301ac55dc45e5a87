// One section with what was written about it.
import 'server-only'
import { countEntries, listEntryIds } from '@/db/queries/entries'
import { getOwnBuildOfKit } from '@/db/queries/builds'
import { getSection } from '@/db/queries/kits'
import { jascTitle } from '@/lib/content/jasc'
import type { AppContext } from '@/lib/context'
import { presentHits } from '@/lib/services/search/present-hits'

/** Null when there is no such section. */
export async function getSectionPage(context: AppContext, kitSlug: string, code: string) {
  const found = await getSection(context.reader, kitSlug, code)
  if (!found) return null
  const filters = { kit: kitSlug, section: code }
  const buildId = context.actor ? await getOwnBuildOfKit(context.reader, context.actor.id, found.kit.id) : null
  const ids = await listEntryIds(context.reader, filters, { limit: 30, offset: 0 })
  return {
    /** The reader's own build of this kit, if they keep one. */
    buildId, kit: found.kit, code: found.section.code, title: found.section.title, system: found.section.jasc ? `JASC ${found.section.jasc} ${jascTitle(found.section.jasc)}` : 'no system',
    total: await countEntries(context.reader, filters), hits: await presentHits(context, ids.map((id) => ({ id, postId: id, score: 0, terms: [] }))),
  }
}
