// What the desk can be narrowed to: the sections of each kit in plan order, and the operations.
import 'server-only'
import { listKits, listOperations, listSections } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'

export interface DeskChoices {
  kits: { name: string; sections: { value: string; title: string }[] }[]
  operations: { slug: string; title: string }[]
}

/** A section's value is `kit:code`, as it stands in the address. */
export async function listDeskChoices({ reader }: AppContext): Promise<DeskChoices> {
  const [kits, sections, operations] = await Promise.all([listKits(reader), listSections(reader), listOperations(reader)])
  return {
    kits: kits.map((k) => ({ name: k.name, sections: sections.filter((s) => s.kitId === k.id).map((s) => ({ value: `${k.slug}:${s.code}`, title: `${s.code} ${s.title}` })) })),
    operations: operations.map(({ slug, title }) => ({ slug, title })),
  }
}
