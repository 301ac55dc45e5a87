// Kits with sections and the operations: what pickers and filters offer.
import 'server-only'
import { listKits, listOperations, listSections } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'

/** Everything in the steward's order. Small enough to read whole. */
export async function listPlaces(context: AppContext) {
  const [kits, sections, operations] = await Promise.all([listKits(context.reader), listSections(context.reader), listOperations(context.reader)])
  return {
    kits: kits.map((k) => ({ slug: k.slug, name: k.name, maker: k.maker, sections: sections.filter((s) => s.kitId === k.id).map((s) => ({ code: s.code, title: s.title, jasc: s.jasc })) })),
    operations: operations.map((o) => ({ slug: o.slug, title: o.title, tasks: o.tasks.map((t) => ({ slug: t.slug, title: t.title })) })),
  }
}
