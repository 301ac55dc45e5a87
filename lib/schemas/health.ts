// What an installation says of itself to whoever watches it. No names, no counts of people.
import { z } from 'zod'

export const healthSchema = z.object({
  /** `failing` comes with 503: the database cannot serve. */
  status: z.enum(['ok', 'failing']),
  version: z.string(),
  /** The last migration this version knows. */
  schema: z.string(),
  db: z.enum(['ok', 'failing']),
  search: z.object({ state: z.enum(['loading', 'ready']), documents: z.int(), sequence: z.int() }),
  mail: z.literal('none'),
  storage: z.literal('none'),
})

export type Health = z.infer<typeof healthSchema>
