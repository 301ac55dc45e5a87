// Markdown as it will look. Reads only.
import { endpoint, routes } from '@/lib/http/route'
import { previewInputSchema, previewResultSchema } from '@/lib/schemas/search'
import { previewText } from '@/lib/services/posts/preview'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Markdown as sanitised HTML', isRead: true, body: previewInputSchema, response: previewResultSchema,
    handle: async ({ context, body }) => ({ body: await previewText(context, body.body) }),
  }),
})
