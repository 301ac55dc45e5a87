// A steward imports entries, one JSON object a line.
import { endpoint, routes } from '@/lib/http/route'
import { importMaxBytes, importResultSchema, importTypes } from '@/lib/schemas/import'
import { importFile } from '@/lib/services/import/import-file'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Import entries as a steward: one ImportLine a line', upload: { types: importTypes, maxBytes: importMaxBytes, act: 'import' }, response: importResultSchema,
    handle: async ({ context, bytes }) => ({ body: await importFile(context, bytes) }),
  }),
})
