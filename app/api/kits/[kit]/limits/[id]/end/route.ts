// A limit of the kit maker that no longer holds.
import { pathId } from '@/lib/http/path-id'
import { endpoint, routes } from '@/lib/http/route'
import { endLimitSchema, kitLimitSchema } from '@/lib/schemas/kit-limits'
import { endLimit } from '@/lib/services/kits/end-limit'
import { listLimits } from '@/lib/services/kits/list-limits'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'End a limit, with a reason (stewards); it stays on record', body: endLimitSchema, response: kitLimitSchema,
    handle: async ({ context, params, body }) => {
      const [kit, id] = [params['kit'] ?? '', pathId(params)]
      await endLimit(context, kit, id, body)
      const { ended } = await listLimits(context, kit)
      return { body: ended.find((limit) => limit.id === id) }
    },
  }),
})
