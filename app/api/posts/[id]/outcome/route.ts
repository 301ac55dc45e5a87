// How it went: one report a member and post.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { outcomeInputSchema } from '@/lib/schemas/acts'
import { outcomesSchema } from '@/lib/schemas/post'
import { getEntry } from '@/lib/services/entries/get-entry'
import { tellHowItWent } from '@/lib/services/outcomes/tell-how-it-went'
import { postOf } from '../../../post-of'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  PUT: endpoint({
    summary: 'Tell how it went with advice; replaces what you told before', body: outcomeInputSchema, response: outcomesSchema,
    handle: async ({ context, params, body }) => {
      const postId = pathId(params)
      const { entryId } = await tellHowItWent(context, postId, body)
      return { body: postOf(await getEntry(context, entryId), postId).outcomes }
    },
  }),
})
