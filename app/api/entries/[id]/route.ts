// One entry: read it, or edit it as its author.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { entryEditSchema } from '@/lib/schemas/entry-input'
import { entrySchema } from '@/lib/schemas/post'
import { editEntry } from '@/lib/services/entries/edit-entry'
import { getEntry } from '@/lib/services/entries/get-entry'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'One entry with its answers', response: entrySchema,
    handle: async ({ context, params }) => ({ body: await getEntry(context, pathId(params)) }),
  }),
  PATCH: endpoint({
    summary: 'A new revision of an entry, by its author', body: entryEditSchema, response: entrySchema,
    handle: async ({ context, params, body }) => {
      await editEntry(context, pathId(params), body)
      return { body: await getEntry(context, pathId(params)) }
    },
  }),
})
