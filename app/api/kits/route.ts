// The kits of this installation.
import { endpoint, routes } from '@/lib/http/route'
import { kitListSchema } from '@/lib/schemas/kits'
import { listKits } from '@/lib/services/kits/list-kits'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'Kits', response: kitListSchema, handle: async ({ context }) => ({ body: await listKits(context) }) }),
})
