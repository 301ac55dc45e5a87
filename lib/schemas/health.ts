// What an installation says of itself to whoever watches it. No names, no counts of people.
import { z } from 'zod'

export const healthSchema = z.object({
  /** `failing` comes with 503: the database cannot serve. */
  status: z.enum(['ok', 'failing']),
  version: z.string(),
  /** The last migration this version knows. */
  schema: z.string(),
  db: z.enum(['ok', 'failing']),
  search: z.object({
    state: z.enum(['loading', 'ready']),
    documents: z.int(),
    sequence: z.int(),
    /** Memory of the search thread, now and at its highest, in megabytes of 10⁶ bytes. */
    memoryMB: z.number(),
    highestMemoryMB: z.number(),
    /** What the index was filled from, and why not from a snapshot when it was not. */
    startedFrom: z.enum(['snapshot', 'tables']).optional(),
    because: z.string().optional(),
    /** The newest snapshot this process saved or started from; `seconds` and `highestMemoryMB` while it was saved. */
    snapshot: z.object({ sequence: z.int(), savedAt: z.int(), MB: z.number(), seconds: z.number().optional(), highestMemoryMB: z.number().optional() }).optional(),
  }),
  mail: z.literal('none'),
  storage: z.literal('none'),
})

export type Health = z.infer<typeof healthSchema>
