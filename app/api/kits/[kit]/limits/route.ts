// The kit maker's own limits: everybody who may read lists them, stewards enter them.
import { endpoint, routes } from '@/lib/http/route'
import { kitLimitListSchema, kitLimitSchema, newLimitSchema } from '@/lib/schemas/kit-limits'
import { enterLimit } from '@/lib/services/kits/enter-limit'
import { listLimits } from '@/lib/services/kits/list-limits'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ summary: 'The kit maker’s own limits, in force and ended', response: kitLimitListSchema, handle: async ({ context, params }) => ({ body: await listLimits(context, params['kit'] ?? '') }) }),
  POST: endpoint({
    summary: 'Enter a limit of the kit maker (stewards)', body: newLimitSchema, response: kitLimitSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const kit = params['kit'] ?? ''
      const { id } = await enterLimit(context, kit, body)
      const { items } = await listLimits(context, kit)
      return { body: items.find((limit) => limit.id === id), headers: { location: `/api/kits/${kit}/limits` } }
    },
  }),
})
