// A kit maker's own limits, as the API and the form take and give them. Whether a table takes them is lib/domain/shop/read-limit.ts.
import { z } from 'zod'
import { isoMoment, person } from './post'
import { limits, line, optionalParagraph, paragraph } from './text'

const short = (what: string) => z.union([z.number().transform(String), z.string().trim()]).pipe(z.string().max(60, `${what}: at most 60 characters.`))

export const newLimitSchema = z.strictObject({
  /** Shop table and result by name, as GET /api/shop lists them. */
  table: z.string().max(60), result: z.string().max(60),
  /** Inputs of the table for which it holds; without any it holds for all. */
  inputs: z.record(z.string().max(40), short('An input')).default({}),
  /** One number, or a least and a most, or words. */
  value: z.strictObject({
    number: short('The number').default(''), min: short('At least').default(''), max: short('At most').default(''),
    words: z.string().transform((v) => v.replace(/\s+/g, ' ').trim()).pipe(z.string().max(200, 'At most 200 characters.')).default(''),
  }),
  /** The result's own unless another is named: mm, ft-lb, N·m, °C, or D for diameters of the fastener. */
  unit: z.string().trim().max(20, 'Not a unit.').default(''),
  reference: z.strictObject({
    title: line(120, 'the bulletin or the manual, such as Bulletin SB-07'), section: line(120, 'where it stands: the page, step or paragraph'),
    year: line(20, 'its date').pipe(z.string().regex(/(?:19|20)\d\d/, 'The date with its year, such as 14 Mar 2026 or 2026.')),
  }),
  note: optionalParagraph(500).default(''),
  /** The sentence of the refusal, sent back by somebody who has read that the limit is less safe than the handbook's. */
  lessSafe: z.string().max(1000).optional(),
})
export const endLimitSchema = z.strictObject({ reason: paragraph(limits.reason, 'the reason') })

export const kitLimitSchema = z.object({
  id: z.int(), table: z.string(), tableTitle: z.string(), result: z.string(), label: z.string(), inputs: z.record(z.string(), z.string()),
  /** The inputs in words; '' for all. */
  holdsFor: z.string(),
  value: z.object({ number: z.number().optional(), min: z.number().optional(), max: z.number().optional(), label: z.string().optional() }),
  unit: z.string(), display: z.object({ inch: z.string(), metric: z.string() }),
  reference: z.object({ title: z.string(), section: z.string(), year: z.string() }), note: z.string(),
  enteredBy: person, createdAt: isoMoment, ended: z.object({ at: isoMoment, reason: z.string() }).optional(),
})
/** Those in force, then those that once held, the newest first. */
export const kitLimitListSchema = z.object({ items: z.array(kitLimitSchema), ended: z.array(kitLimitSchema) })

export type NewLimit = z.infer<typeof newLimitSchema>
export type KitLimit = z.infer<typeof kitLimitSchema>
export type KitLimitList = z.infer<typeof kitLimitListSchema>
