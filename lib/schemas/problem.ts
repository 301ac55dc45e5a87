// The one shape of every refusal under /api: problem details as RFC 9457 lays them down, with the fields that were wrong.
import { z } from 'zod'

export const problemSchema = z.object({
  type: z.string(), title: z.string(), status: z.int(), detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** The present version, on a conflict. */
  current: z.unknown().optional(),
})

export type Problem = z.infer<typeof problemSchema>
