// The measurements of a text, found and normalised. Reads only.
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { endpoint, routes } from '@/lib/http/route'
import { measurementsInputSchema, measurementsResultSchema } from '@/lib/schemas/measurement'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'The measurements of a text', isRead: true, body: measurementsInputSchema, response: measurementsResultSchema,
    handle: async ({ body }) => ({ body: { measurements: findMeasurements(body.text) } }),
  }),
})
