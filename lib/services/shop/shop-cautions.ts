// The cautions that go with a shop table: the texts of the rule table for the topics the table names.
import 'server-only'
import { cautionTable } from '@/lib/content/caution-table'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import type { ShopTable } from '@/lib/domain/shop/shop-table'
import type { Caution } from '@/lib/schemas/post'

/** Cautions of a named topic that no table is about: nobody hoists a wing to bend a flange. */
const elsewhere = new Set(['pinch-load'])

/** Worst first. Empty only for a table that names no topic. */
export function shopCautions({ cautions: topics, title }: Pick<ShopTable, 'cautions' | 'title'>): Caution[] {
  const named = cautionTable.cautions.filter(({ topic, code }) => topics.includes(topic) && !elsewhere.has(code))
  return unionCautions([named]).map((caution) => ({ ...caution, because: `shop table: ${title}`, origin: 'rule' as const }))
}
