// Kits with their sections in plan order, and operations with their tasks, as the API lists them.
import { z } from 'zod'

export const kitListSchema = z.object({ items: z.array(z.object({ slug: z.string(), name: z.string(), maker: z.string() })) })
export const kitSchema = z.object({
  slug: z.string(), name: z.string(), maker: z.string(),
  /** `jasc` is the four-digit FAA JASC system code; null where the work is on no system. */
  sections: z.array(z.object({ code: z.string(), title: z.string(), position: z.int(), jasc: z.string().nullable() })),
})
export const operationListSchema = z.object({
  items: z.array(z.object({ slug: z.string(), title: z.string(), tasks: z.array(z.object({ slug: z.string(), title: z.string() })) })),
})

export type KitList = z.infer<typeof kitListSchema>
export type Kit = z.infer<typeof kitSchema>
export type OperationList = z.infer<typeof operationListSchema>
