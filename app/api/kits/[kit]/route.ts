// One kit with its sections in plan order.
import { endpoint, routes } from '@/lib/http/route'
import { kitSchema } from '@/lib/schemas/kits'
import { getKit } from '@/lib/services/kits/get-kit'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'One kit with its sections in plan order', response: kitSchema, handle: async ({ context, params }) => ({ body: await getKit(context, params['kit'] ?? '') }) }),
})
