// What waits for whoever asks.
import { endpoint, routes } from '@/lib/http/route'
import { noticeListSchema, noticesQuerySchema } from '@/lib/schemas/notices'
import { listNotices } from '@/lib/services/notices/list-notices'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'What waits for me', query: noticesQuerySchema, response: noticeListSchema, handle: async ({ context, query }) => ({ body: await listNotices(context, query) }) }),
})
