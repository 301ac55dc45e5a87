// Turns the names an author sent (kit, sections, tasks, operations) into rows, or says which name is unknown.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { getKit, listOperationsBySlug, listTasksBySlug } from '@/db/queries/kits'
import { AppError, type FieldError } from '@/lib/errors'

export interface Placement {
  kitId: number
  sections: { id: number; code: string; jasc: string | null }[]
  taskIds: number[]
  operationIds: number[]
  /** Slugs, those of the tasks included. */
  operations: string[]
}
interface Names { kit: string; sections: readonly string[]; tasks: readonly string[]; operations: readonly string[]; orderAdvice?: readonly { before: string; after: string }[] }

/** Refuses with 422 and a path for every unknown name. */
export async function placeEntry(reader: ReaderOrTransaction, names: Names): Promise<Placement> {
  const errors: FieldError[] = []
  const kit = await getKit(reader, names.kit)
  if (!kit) errors.push({ path: 'kit', message: `There is no kit ${names.kit}.` })
  const sections = names.sections.map((code, i) => {
    const found = kit?.sections.find((s) => s.code.toLowerCase() === code.toLowerCase())
    if (kit && !found) errors.push({ path: `sections.${i}`, message: `${kit.name} has no section ${code}.` })
    return found
  })
  const adviceTasks = (names.orderAdvice ?? []).flatMap((o) => [o.before, o.after])
  const tasks = await listTasksBySlug(reader, [...names.tasks, ...adviceTasks])
  names.tasks.forEach((slug, i) => { if (!tasks.some((t) => t.slug === slug)) errors.push({ path: `tasks.${i}`, message: `There is no task ${slug}.` }) })
  names.orderAdvice?.forEach((o, i) => {
    for (const side of ['before', 'after'] as const) if (!tasks.some((t) => t.slug === o[side])) errors.push({ path: `orderAdvice.${i}.${side}`, message: `There is no task ${o[side]}.` })
  })
  const operations = await listOperationsBySlug(reader, names.operations)
  names.operations.forEach((slug, i) => { if (!operations.some((o) => o.slug === slug)) errors.push({ path: `operations.${i}`, message: `There is no operation ${slug}.` }) })
  if (errors.length || !kit) throw new AppError('invalid', errors[0]?.message ?? 'Unknown names.', { errors })
  const own = tasks.filter((t) => names.tasks.includes(t.slug))
  return {
    kitId: kit.id,
    sections: sections.flatMap((s) => s ?? []).filter((s, i, all) => all.findIndex((x) => x.id === s.id) === i),
    taskIds: own.map((t) => t.id),
    operationIds: [...new Set([...own.map((t) => t.operationId), ...operations.map((o) => o.id)])],
    operations: [...new Set([...own.map((t) => t.operation), ...operations.map((o) => o.slug)])],
  }
}
