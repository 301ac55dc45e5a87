// A line of the log, read and corrected.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { changeLogLineSchema, logLineSchema } from '@/lib/schemas/builds'
import { changeLogLine, readLogLine } from '@/lib/services/builds/add-log-line'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'A line of my log', response: logLineSchema,
    handle: async ({ context, params }) => ({ body: await readLogLine(context, pathId(params), pathId(params, 'line')) }),
  }),
  PATCH: endpoint({
    summary: 'Write a line of my log anew', body: changeLogLineSchema, response: logLineSchema,
    handle: async ({ context, params, body }) => ({ body: await changeLogLine(context, pathId(params), pathId(params, 'line'), body) }),
  }),
})
