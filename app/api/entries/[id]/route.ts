// One entry: read it, or edit it as its author.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { entryEditSchema } from '@/lib/schemas/entry-input'
import { editEntry } from '@/lib/services/entries/edit-entry'
import { getEntry } from '@/lib/services/entries/get-entry'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({ handle: async ({ context, params }) => ({ body: await getEntry(context, pathId(params)) }) }),
  PATCH: endpoint({
    body: entryEditSchema,
    handle: async ({ context, params, body }) => {
      await editEntry(context, pathId(params), body)
      return { body: await getEntry(context, pathId(params)) }
    },
  }),
})
