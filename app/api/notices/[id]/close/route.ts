// Closes what waited for whoever asks.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { closeNoticeSchema, noticeSchema } from '@/lib/schemas/notices'
import { closeNotice } from '@/lib/services/notices/close-notice'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({ summary: 'Close what waited for me', body: closeNoticeSchema, response: noticeSchema, handle: async ({ context, params }) => ({ body: await closeNotice(context, pathId(params)) }) }),
})
