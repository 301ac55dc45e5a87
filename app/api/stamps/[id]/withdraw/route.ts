// A mentor takes their own stamp back.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { withdrawStampSchema } from '@/lib/schemas/acts'
import { stampSchema } from '@/lib/schemas/post'
import { getEntry } from '@/lib/services/entries/get-entry'
import { withdrawStamp } from '@/lib/services/stamps/withdraw-stamp'
import { postOf } from '../../../post-of'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Withdraw your own stamp, with a reason', body: withdrawStampSchema, response: stampSchema,
    handle: async ({ context, params, body }) => {
      const id = pathId(params)
      const { postId, entryId } = await withdrawStamp(context, id, body)
      return { body: postOf(await getEntry(context, entryId), postId).stamps.find((s) => s.id === id) }
    },
  }),
})
