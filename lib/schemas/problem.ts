// The one shape of every refusal under /api: problem details as RFC 9457 lays them down, with the fields that were wrong.
import { z } from 'zod'
import { cautionSchema } from './post'

export const problemSchema = z.object({
  type: z.string(), title: z.string(), status: z.int(), detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** The present version, on a conflict. */
  current: z.unknown().optional(),
  /** The cautions that must be read and acknowledged first, with their words. */
  cautions: z.array(cautionSchema).optional(),
})

export type Problem = z.infer<typeof problemSchema>
