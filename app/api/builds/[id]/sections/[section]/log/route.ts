// The log of a section: a line is kept once, by its key.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { logLineSchema, newLogLineSchema } from '@/lib/schemas/builds'
import { addLogLine } from '@/lib/services/builds/add-log-line'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Write a line in the log; the same key again gives the line that is there', body: newLogLineSchema, response: logLineSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const id = pathId(params)
      const line = await addLogLine(context, id, params['section'] ?? '', body)
      return { body: line, headers: { location: `/api/builds/${id}/log/${line.id}` } }
    },
  }),
})
