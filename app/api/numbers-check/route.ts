// A text's advised and measured numbers against the shop tables. Reads only.
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import { endpoint, routes } from '@/lib/http/route'
import { numbersCheckInputSchema, numbersCheckResultSchema } from '@/lib/schemas/numbers-check'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'A text’s numbers against the shop tables', isRead: true, body: numbersCheckInputSchema, response: numbersCheckResultSchema,
    handle: async ({ body: { text, tasks = [], hardware = [] } }) => ({ body: { checks: checkNumbers(text, { tasks, hardware }) } }),
  }),
})
