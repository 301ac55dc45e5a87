// The shop tables with their inputs, limits and results.
import { endpoint, routes } from '@/lib/http/route'
import { shopListSchema } from '@/lib/schemas/shop'
import { listShopTables } from '@/lib/services/shop/list-shop-tables'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'Shop tables with their inputs, limits and results', response: shopListSchema, handle: async () => ({ body: listShopTables() }) }),
})
