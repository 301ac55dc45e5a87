// The numbers check of a text, as the API gives it.
import { z } from 'zod'
import { BASES } from '@/lib/domain/shop/shop-table'
import { sourceSchema } from './shop'
import { limits, slug } from './text'

const longest = 4 * limits.body
export const numbersCheckInputSchema = z.strictObject({
  text: z.string().max(longest, `At most ${longest.toLocaleString('en')} characters.`),
  tasks: z.array(slug).max(limits.list).optional(), hardware: z.array(z.string().max(80)).max(limits.list).optional(), kit: slug.optional(),
})
export const numbersCheckSchema = z.object({
  claim: z.string(), start: z.int(), end: z.int(), role: z.enum(['advised', 'measured']), verdict: z.enum(['agrees', 'conflicts', 'cannot-tell']),
  expected: z.string().optional(), table: z.string().optional(),
  source: sourceSchema.nullable().optional(), basis: z.enum(BASES).optional(),
  makerLimit: z.string().optional().describe('The kit maker’s own limit where it does not allow what a handbook does; it wins.'),
})
export const numbersCheckResultSchema = z.object({ checks: z.array(numbersCheckSchema) })

export type NumbersCheckItem = z.infer<typeof numbersCheckSchema>
