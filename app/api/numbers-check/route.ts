// A text's advised and measured numbers against the shop tables and, where a kit is named, its maker's own limits. Reads only.
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import { endpoint, routes } from '@/lib/http/route'
import { requireMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { numbersCheckInputSchema, numbersCheckResultSchema } from '@/lib/schemas/numbers-check'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'A text’s numbers against the shop tables', isRead: true, body: numbersCheckInputSchema, response: numbersCheckResultSchema,
    handle: async ({ context, body: { text, tasks = [], hardware = [], kit } }) => ({ body: { checks: checkNumbers(text, { tasks, hardware, limits: await requireMakerLimits(context.reader, kit) }) } }),
  }),
})
