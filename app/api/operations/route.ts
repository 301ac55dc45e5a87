// Operations with their tasks.
import { endpoint, routes } from '@/lib/http/route'
import { operationListSchema } from '@/lib/schemas/kits'
import { listOperations } from '@/lib/services/kits/list-operations'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'Operations with their tasks', response: operationListSchema, handle: async ({ context }) => ({ body: await listOperations(context) }) }),
})
