// One shop table computed from the inputs in the query.
import { endpoint, routes } from '@/lib/http/route'
import { shopAnswerSchema, shopQuerySchema } from '@/lib/schemas/shop'
import { getShopAnswer } from '@/lib/services/shop/get-shop-answer'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'A shop table computed; its inputs, named by GET /api/shop, are the query, with `kit` for its maker’s own limits', query: shopQuerySchema, response: shopAnswerSchema,
    handle: async ({ context, params, query: { kit, ...raw } }) => ({ body: await getShopAnswer(context, params['table'] ?? '', raw, kit) }),
  }),
})
