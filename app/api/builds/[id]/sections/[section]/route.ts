// One section of an aeroplane, and where the work on it stands.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { buildSectionSchema, setSectionSchema } from '@/lib/schemas/builds'
import { getBuildSection } from '@/lib/services/builds/get-build-section'
import { setSectionState } from '@/lib/services/builds/set-section-state'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  GET: endpoint({
    summary: 'A section of my build: log, holds, what I go by, closing list', response: buildSectionSchema,
    handle: async ({ context, params }) => ({ body: await getBuildSection(context, pathId(params), params['section'] ?? '') }),
  }),
  PATCH: endpoint({
    summary: 'Say where the work on a section stands', body: setSectionSchema, response: buildSectionSchema,
    handle: async ({ context, params, body }) => {
      const [id, code] = [pathId(params), params['section'] ?? '']
      await setSectionState(context, id, code, body.state)
      return { body: await getBuildSection(context, id, code) }
    },
  }),
})
