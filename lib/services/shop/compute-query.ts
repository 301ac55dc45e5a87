// Search's computed answers: the likeliest reading of a query, with the others one tap away.
import 'server-only'
import { readShopQuery } from '@/lib/domain/shop/read-query'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { answerTable } from './answer-table'

/** At most one answer; none when no table has what was asked. */
export function computeQuery(text: string): ShopAnswer[] {
  const readings = readShopQuery(text)
  for (const reading of readings) {
    const table = shopTable(reading.table)
    if (!table) continue
    const alternatives = readings.filter((other) => other !== reading).map((other) => ({ label: other.label, url: paths.shopTable(other.table, other.inputs) }))
    const answered = answerTable(table, reading.inputs, { readAs: reading.label, alternatives })
    if (answered.ok) return [answered.answer]
  }
  return []
}
