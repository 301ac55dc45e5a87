// A mentor stamps a revision.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { newStampSchema } from '@/lib/schemas/acts'
import { stampSchema } from '@/lib/schemas/post'
import { getEntry } from '@/lib/services/entries/get-entry'
import { pressStamp } from '@/lib/services/stamps/press-stamp'
import { located } from '../../../located'
import { postOf } from '../../../post-of'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Stamp a revision, with its basis, as a mentor', body: newStampSchema, response: stampSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const postId = pathId(params)
      const { id, entryId } = await pressStamp(context, postId, body)
      const { stamps } = postOf(await getEntry(context, entryId), postId)
      return { body: stamps.find((s) => s.id === id), headers: located(entryId, `stamp-${id}`) }
    },
  }),
})
