// Which cautions a text will have to carry. Reads only.
import { endpoint, routes } from '@/lib/http/route'
import { requiredCautionsInputSchema, requiredCautionsResultSchema } from '@/lib/schemas/search'
import { listRequiredCautions } from '@/lib/services/cautions/required-cautions'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'The cautions that a text will have to carry', isRead: true, body: requiredCautionsInputSchema, response: requiredCautionsResultSchema,
    handle: async ({ context, body }) => ({ body: await listRequiredCautions(context, body) }),
  }),
})
