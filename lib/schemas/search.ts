// Search, suggest, similar, preview and required cautions.
import { z } from 'zod'
import { CAUTION_TOPICS } from '@/lib/domain/cautions/rule-table'
import { cautionSchema, outcomesSchema, stampSchema, stampStateSchema } from './post'
import { measurementSchema } from './measurement'
import { shopAnswerSchema } from './shop'
import { limits, sectionCode, slug } from './text'

const count = (max: number) => z.string().regex(/^[0-9]{1,9}$/, 'A whole number.').transform(Number).pipe(z.int().max(max, `At most ${max}.`))
const filters = {
  kit: slug.optional(), section: sectionCode.optional(), operation: slug.optional(),
  kind: z.enum(['question', 'lesson']).optional(), stamped: z.literal('1').optional(),
}
const needsKit = (v: { kit?: string | undefined; section?: string | undefined }) => v.section === undefined || v.kit !== undefined
const needsKitMessage = { path: ['section'], message: 'A section needs its kit.' }

export const searchQuerySchema = z.strictObject({
  q: z.string().max(limits.query, `At most ${limits.query} characters.`).default(''), ...filters,
  limit: count(100).pipe(z.int().min(1, 'At least 1.')).default(20), offset: count(10_000).default(0),
}).refine(needsKit, needsKitMessage)
export const entriesQuerySchema = z.strictObject({
  ...filters, limit: count(100).pipe(z.int().min(1, 'At least 1.')).default(20), cursor: z.string().max(200).optional(),
}).refine(needsKit, needsKitMessage)
export const suggestQuerySchema = z.strictObject({ q: z.string().max(limits.query, `At most ${limits.query} characters.`).default('') })
export const similarInputSchema = z.strictObject({
  title: z.string().max(limits.title), body: z.string().max(limits.body).optional(), kit: slug.optional(), tasks: z.array(slug).max(limits.list).optional(),
})
export const previewInputSchema = z.strictObject({ body: z.string().max(limits.body, `At most ${limits.body.toLocaleString('en')} characters.`) })
export const requiredCautionsInputSchema = z.strictObject({
  title: z.string().max(limits.title).optional(), body: z.string().max(4 * limits.body), tasks: z.array(slug).max(limits.list).optional(),
  operations: z.array(slug).max(limits.list).optional(), hardware: z.array(z.string().max(80)).max(limits.list).optional(),
  kit: slug.optional(), sections: z.array(sectionCode).max(limits.list).optional(),
  /** The question that `body` is an answer to: then its words, place and cautions count, and nothing else of this. */
  question: z.int().positive().optional(),
})

export const hitSchema = z.object({
  id: z.int(), kind: z.enum(['question', 'lesson']), ref: z.string().optional(), title: z.string(), url: z.string(),
  passage: z.object({ postId: z.int(), kind: z.enum(['question', 'lesson', 'answer']), author: z.object({ id: z.int().optional(), name: z.string() }), revision: z.string() }),
  snippet: z.string(), marks: z.array(z.tuple([z.int(), z.int()])), score: z.number(), kit: z.string(), sections: z.array(z.string()),
  tasks: z.array(z.string()),
  /** Sections and tasks as they are printed on part tags. */
  partTags: z.array(z.object({ code: z.string().optional(), title: z.string() })),
  stamp: stampStateSchema, stamps: z.array(stampSchema), needsTwo: z.boolean(),
  /** Its order advice about the two tasks a question asks the order of, by title; contrary advice stands in other hits, or beside it. */
  orderAdvice: z.array(z.object({ postId: z.int(), before: z.string(), after: z.string() })).optional(),
  open: z.boolean(), answers: z.int(), outcomes: outcomesSchema, cautions: z.array(cautionSchema),
  balloons: z.array(z.int()).describe('Numbers of the balloons of computed[0] that the passage speaks of, most about first; empty without a computed answer.'),
})
export const searchResultSchema = z.object({
  query: z.object({ text: z.string(), ignored: z.array(z.string()), measurements: z.array(measurementSchema), didYouMean: z.string().optional() }),
  /** A shop table's answer to a query for a number. */
  computed: z.array(shopAnswerSchema), results: z.array(hitSchema), total: z.int(), tookMs: z.number(),
})
export const suggestionSchema = z.object({
  text: z.string(), kind: z.enum(['question', 'lesson', 'section', 'operation', 'shop']), id: z.int().optional(), url: z.string(),
  cautions: z.array(z.object({ signalWord: z.enum(['WARNING', 'CAUTION', 'NOTICE']), topic: z.enum(CAUTION_TOPICS) })),
})
export const requiredCautionsResultSchema = z.object({ cautions: z.array(cautionSchema) })
export const previewResultSchema = z.object({ html: z.string(), measurements: z.array(measurementSchema) })

export type Hit = z.infer<typeof hitSchema>
export type SearchQuery = z.infer<typeof searchQuerySchema>
export type SearchResult = z.infer<typeof searchResultSchema>
export type Suggestion = z.infer<typeof suggestionSchema>
export type EntriesQuery = z.infer<typeof entriesQuerySchema>
