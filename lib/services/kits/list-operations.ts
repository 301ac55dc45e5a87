// Operations in the steward's order, each with its tasks.
import 'server-only'
import { listOperations as listOperationRows } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import type { OperationList } from '@/lib/schemas/kits'

export async function listOperations(context: AppContext): Promise<OperationList> {
  const rows = await listOperationRows(context.reader)
  return { items: rows.map((o) => ({ slug: o.slug, title: o.title, tasks: o.tasks.map(({ slug, title }) => ({ slug, title })) })) }
}
