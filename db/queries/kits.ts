// Kits with sections in plan order; operations with their tasks.
import 'server-only'
import { and, asc, eq, inArray } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { kit, operation, section, task } from '../schema'

export async function listKits(reader: ReaderOrTransaction) {
  return reader.select().from(kit).orderBy(asc(kit.id))
}

/** A kit by slug with its sections in plan order, or null. */
export async function getKit(reader: ReaderOrTransaction, slug: string) {
  const rows = await reader.select({ kit, section }).from(kit).leftJoin(section, eq(section.kitId, kit.id)).where(eq(kit.slug, slug)).orderBy(asc(section.position))
  const first = rows[0]
  return first ? { ...first.kit, sections: rows.flatMap((r) => r.section ?? []) } : null
}

export async function getSection(reader: ReaderOrTransaction, kitSlug: string, code: string) {
  const [row] = await reader.select({ kit, section }).from(section).innerJoin(kit, eq(kit.id, section.kitId)).where(and(eq(kit.slug, kitSlug), eq(section.code, code)))
  return row ?? null
}

export async function listSections(reader: ReaderOrTransaction) {
  return reader.select({ id: section.id, kit: kit.slug, kitId: kit.id, code: section.code, title: section.title, jasc: section.jasc }).from(section)
    .innerJoin(kit, eq(kit.id, section.kitId)).orderBy(asc(kit.id), asc(section.position))
}

/** Operations in the steward's order, each with its tasks. */
export async function listOperations(reader: ReaderOrTransaction) {
  const rows = await reader.select({ operation, task }).from(operation).leftJoin(task, eq(task.operationId, operation.id)).orderBy(asc(operation.position), asc(task.position))
  const operations = new Map<number, typeof operation.$inferSelect & { tasks: (typeof task.$inferSelect)[] }>()
  for (const row of rows) {
    const known = operations.get(row.operation.id) ?? { ...row.operation, tasks: [] }
    if (row.task) known.tasks.push(row.task)
    operations.set(row.operation.id, known)
  }
  return [...operations.values()]
}

export async function listTasksBySlug(reader: ReaderOrTransaction, slugs: readonly string[]) {
  if (slugs.length === 0) return []
  return reader.select({ id: task.id, slug: task.slug, title: task.title, operation: operation.slug, operationId: operation.id }).from(task)
    .innerJoin(operation, eq(operation.id, task.operationId)).where(inArray(task.slug, [...slugs]))
}

export async function listOperationsBySlug(reader: ReaderOrTransaction, slugs: readonly string[]) {
  if (slugs.length === 0) return []
  return reader.select().from(operation).where(inArray(operation.slug, [...slugs]))
}
