// A short note under a post.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { newRemarkSchema } from '@/lib/schemas/acts'
import { remarkSchema } from '@/lib/schemas/post'
import { addRemark } from '@/lib/services/entries/add-remark'
import { getEntry } from '@/lib/services/entries/get-entry'
import { located } from '../../../located'
import { postOf } from '../../../post-of'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Remark under an entry or an answer', body: newRemarkSchema, response: remarkSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const postId = pathId(params)
      const { id, entryId } = await addRemark(context, postId, body)
      const { remarks } = postOf(await getEntry(context, entryId), postId)
      return { body: remarks.find((r) => r.id === id), headers: located(entryId, `remark-${id}`) }
    },
  }),
})
