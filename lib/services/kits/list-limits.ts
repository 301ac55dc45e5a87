// A kit's limits as its page and the API show them: in force and ended, each with who entered it.
import 'server-only'
import { listLimitRecords } from '@/db/queries/kit-limits'
import { getKit } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { inputWords } from '@/lib/domain/shop/input-words'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { refuse } from '@/lib/errors'
import type { KitLimit, KitLimitList } from '@/lib/schemas/kit-limits'

/** 404 for a kit that isn't there. */
export async function listLimits(context: AppContext, slug: string): Promise<KitLimitList> {
  const kit = await getKit(context.reader, slug)
  if (!kit) throw refuse.notFound('This kit')
  const limits = (await listLimitRecords(context.reader, kit.id)).map(presentLimit)
  return { items: limits.filter(({ ended }) => !ended), ended: limits.filter(({ ended }) => ended) }
}

type LimitRecord = Awaited<ReturnType<typeof listLimitRecords>>[number]
const iso = (ms: number) => new Date(ms).toISOString()

function presentLimit({ limit, enteredBy }: LimitRecord): KitLimit {
  const { id, table: slug, result, inputs, value, unit, display, reference, note, createdAt, endedAt, endReason } = limit
  const table = shopTable(slug)
  return {
    id, table: slug, tableTitle: table?.title ?? slug, result, label: table?.results.find(({ name }) => name === result)?.label ?? result,
    inputs, holdsFor: table ? inputWords(table, inputs) : '', value, unit, display, reference, note,
    enteredBy: enteredBy ? { id: enteredBy.id, name: enteredBy.name } : { name: 'former member' }, createdAt: iso(createdAt),
    ...(endedAt === null ? {} : { ended: { at: iso(endedAt), reason: endReason ?? '' } }),
  }
}
