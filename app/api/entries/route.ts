// Entries by filter, newest first; and a new question or lesson.
import { z } from 'zod'
import { endpoint, routes } from '@/lib/http/route'
import { newEntrySchema } from '@/lib/schemas/entry-input'
import { entriesQuerySchema } from '@/lib/schemas/search'
import { entrySchema } from '@/lib/schemas/post'
import { createEntry } from '@/lib/services/entries/create-entry'
import { getEntry } from '@/lib/services/entries/get-entry'
import { listEntries } from '@/lib/services/entries/list-entries'
import { located } from '../located'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'Entries by filter, newest first', query: entriesQuerySchema, response: z.object({ items: z.array(entrySchema), nextCursor: z.string().nullable() }),
    handle: async ({ context, query }) => ({ body: await listEntries(context, query) }),
  }),
  POST: endpoint({
    summary: 'Publish a question or a lesson', body: newEntrySchema, response: entrySchema, status: 201,
    handle: async ({ context, body }) => {
      const id = await createEntry(context, body)
      return { body: await getEntry(context, id), headers: located(id) }
    },
  }),
})
