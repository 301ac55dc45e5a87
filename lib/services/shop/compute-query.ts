// Search's computed answers: the likeliest reading of a query, with the others one tap away.
import 'server-only'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import { readShopQuery } from '@/lib/domain/shop/read-query'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { answerTable } from './answer-table'

/** At most one answer; none when no table has what was asked. `limits` are those of `kit`. */
export function computeQuery(text: string, { kit, limits = [] }: { kit?: string | undefined; limits?: readonly MakerLimit[] } = {}): ShopAnswer[] {
  const readings = readShopQuery(text)
  for (const reading of readings) {
    const table = shopTable(reading.table)
    if (!table) continue
    const alternatives = readings.filter((other) => other !== reading).map((other) => ({ label: other.label, url: paths.shopTable(other.table, { ...other.inputs, ...(kit ? { kit } : {}) }) }))
    const answered = answerTable(table, reading.inputs, { readAs: reading.label, alternatives, kit, limits })
    if (answered.ok) return [answered.answer]
  }
  return []
}
