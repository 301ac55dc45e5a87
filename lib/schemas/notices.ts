// What waits for a member. A title never stands without its post's cautions.
import { z } from 'zod'
import { cautionSchema, planChangeSchema } from './post'

export const noticeSchema = z.object({
  id: z.int(), kind: z.enum(['bulletin', 'withdrawal']), createdAt: z.iso.datetime(), closedAt: z.iso.datetime().optional(),
  /** The post it is about, with the entry it stands in. */
  post: z.object({ id: z.int(), title: z.string(), url: z.string(), cautions: z.array(cautionSchema) }),
  /** Of a bulletin: the kit maker's change in one line of our own words, and where it touches the post. */
  bulletin: z.object({ number: z.string(), issuedOn: z.string(), serials: z.string(), summary: z.string(), kit: z.string(), places: z.array(planChangeSchema) }).optional(),
})
export const noticeListSchema = z.object({ items: z.array(noticeSchema), nextCursor: z.string().nullable() })
export const noticesQuerySchema = z.strictObject({
  limit: z.string().regex(/^[0-9]{1,3}$/, 'A whole number.').transform(Number).pipe(z.int().min(1).max(100, 'At most 100.')).default(20),
  cursor: z.string().regex(/^[1-9][0-9]{0,14}$/, 'Not a cursor of this list.').transform(Number).optional(),
})
export const closeNoticeSchema = z.strictObject({})

export type Notice = z.infer<typeof noticeSchema>
export type NoticeList = z.infer<typeof noticeListSchema>
