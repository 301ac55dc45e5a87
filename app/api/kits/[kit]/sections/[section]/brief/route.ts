// The brief of a section, with the same content as its page.
import { endpoint, routes } from '@/lib/http/route'
import { briefSchema } from '@/lib/schemas/brief'
import { getBrief } from '@/lib/services/briefs/get-brief'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'What to know before a section: its tasks in working order, with cautions, sizes, know-how, lessons and open questions', response: briefSchema, handle: async ({ context, params }) => ({ body: await getBrief(context, params['kit'] ?? '', params['section'] ?? '') }) }),
})
