// The names an import may use: kits, sections, operations and tasks by slug, code or title, in any case.
// Read once an import; what it gives are the slugs and codes that the entry's own schema takes.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { listKits, listOperations, listSections } from '@/db/queries/kits'
import { AppError, type FieldError } from '@/lib/errors'
import type { ImportNames } from '@/lib/schemas/import'

type Book = Map<string, string>

export interface NameBook { kits: Book; sections: Map<string, Book>; operations: Book; tasks: Book }

const folded = (name: string) => name.normalize('NFC').trim().replace(/\s+/g, ' ').toLowerCase()
const dashed = (name: string) => folded(name).replaceAll(' ', '-')

/** Titles first, so that a slug or code wins where both read the same. */
function book(rows: readonly { slug: string; title: string }[]): Book {
  return new Map([...rows.map((r) => [folded(r.title), r.slug] as const), ...rows.map((r) => [folded(r.slug), r.slug] as const)])
}

/** The names that the installation knows now. */
export async function readNameBook(reader: ReaderOrTransaction): Promise<NameBook> {
  const [kits, sections, operations] = await Promise.all([listKits(reader), listSections(reader), listOperations(reader)])
  return {
    kits: book(kits.map((k) => ({ slug: k.slug, title: k.name }))),
    sections: new Map(kits.map((k) => [k.slug, book(sections.filter((s) => s.kitId === k.id).map((s) => ({ slug: s.code, title: s.title })))])),
    operations: book(operations),
    tasks: book(operations.flatMap((o) => o.tasks)),
  }
}

/** The line with slugs for names. Throws one refusal that names everything unknown. */
export function resolveNames(known: NameBook, names: ImportNames): ImportNames {
  const errors: FieldError[] = []
  const find = (where: Book, name: string, path: string, what: string) => {
    const slug = where.get(folded(name)) ?? where.get(dashed(name))
    if (slug === undefined) errors.push({ path, message: `There is no ${what} “${name}”.` })
    return slug ?? name
  }
  const kit = find(known.kits, names.kit, 'kit', 'kit')
  const sections = known.sections.get(kit)
  const resolved: ImportNames = {
    ...names, kit,
    // Without its kit a section cannot be looked up: the kit alone is named.
    sections: sections ? names.sections.map((s, i) => find(sections, s, `sections.${i}`, `section of ${names.kit}:`)) : names.sections,
    ...(names.tasks ? { tasks: names.tasks.map((t, i) => find(known.tasks, t, `tasks.${i}`, 'task')) } : {}),
    ...(names.operations ? { operations: names.operations.map((o, i) => find(known.operations, o, `operations.${i}`, 'operation')) } : {}),
    ...(names.orderAdvice ? {
      orderAdvice: names.orderAdvice.map((o, i) => ({ ...o, before: find(known.tasks, o.before, `orderAdvice.${i}.before`, 'task'), after: find(known.tasks, o.after, `orderAdvice.${i}.after`, 'task') })),
    } : {}),
  }
  if (errors.length) throw new AppError('invalid', errors.map((e) => e.message).join(' '), { errors })
  return resolved
}
