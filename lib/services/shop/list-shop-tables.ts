// The shop tables with their inputs, limits and results.
import 'server-only'
import type { ShopInput } from '@/lib/domain/shop/shop-input'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'
import type { ShopList } from '@/lib/schemas/shop'

export function listShopTables(): ShopList {
  return {
    items: SHOP_TABLES.map(({ slug, title, inputs, results }) => ({
      slug, title, url: paths.shopTable(slug), inputs: inputs.map(presentInput), results: results.map(({ name, label, unit }) => ({ name, label, unit })),
    })),
  }
}

function presentInput({ name, label, unit, kind, min, max, options, default: standing, hint }: ShopInput): ShopList['items'][number]['inputs'][number] {
  return {
    name, label, unit, kind, ...(min === undefined ? {} : { min }), ...(max === undefined ? {} : { max }),
    ...(options ? { options: options.map(({ value }) => value) } : {}), default: standing, ...(hint ? { hint } : {}),
  }
}
