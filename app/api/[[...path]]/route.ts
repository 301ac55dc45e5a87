// Every other address under /api is not there, and says so as a problem, never as a page.
import { AppError, refuse } from '@/lib/errors'
import { endpoint, routes } from '@/lib/http/route'
import { z } from 'zod'

const nothing = endpoint({
  summary: 'Not there', isRead: true, query: z.unknown(),
  handle: async ({ params }) => {
    if (params['path'] === 'unreadable-address') throw new AppError('malformed', 'The address is not percent-encoded UTF-8.')
    throw refuse.notFound('This address')
  },
})
export const { GET, POST, PUT, PATCH, DELETE } = routes({ GET: nothing, POST: nothing, PUT: nothing, PATCH: nothing, DELETE: nothing })
