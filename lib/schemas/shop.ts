// Shop tables as the API lists and answers them.
import { z } from 'zod'
import { BASES } from '@/lib/domain/shop/shop-table'
import { cautionSchema } from './post'

const inputKinds = ['length', 'drill', 'torque', 'number', 'choice', 'part', 'exact'] as const

export const shopInputSchema = z.object({
  name: z.string(), label: z.string(), unit: z.string(), kind: z.enum(inputKinds),
  /** Limits in `unit`. */
  min: z.number().optional(), max: z.number().optional(),
  /** The values of a choice; others are refused. */
  options: z.array(z.string()).optional(),
  /** What an input that is left out counts as; null: it may be left out. */
  default: z.string().nullable(), hint: z.string().optional(),
})
export const shopListSchema = z.object({
  items: z.array(z.object({
    slug: z.string(), title: z.string(), url: z.string(), inputs: z.array(shopInputSchema),
    results: z.array(z.object({ name: z.string(), label: z.string(), unit: z.string() })),
  })),
})

/** Whose a value is. */
export const sourceSchema = z.object({ title: z.string(), section: z.string(), year: z.string() })

export const shopResultSchema = z.object({
  name: z.string(), label: z.string(),
  /** A number, a range, words, or nothing where the table has no value. */
  value: z.object({ number: z.number().optional(), min: z.number().optional(), max: z.number().optional(), label: z.string().optional() }),
  unit: z.string(), display: z.object({ inch: z.string(), metric: z.string() }),
  source: sourceSchema.nullable(), basis: z.enum(BASES),
  note: z.string().optional(), how: z.string().optional(),
  /** In what the caller's own measure doesn't meet this result. */
  against: z.string().optional(),
})
export const shopAnswerSchema = z.object({
  table: z.string(), inputs: z.record(z.string(), z.union([z.string(), z.number()])), readAs: z.string(),
  alternatives: z.array(z.object({ label: z.string(), url: z.string() })), results: z.array(shopResultSchema),
  cautions: z.array(cautionSchema), url: z.string(),
  balloons: z.array(z.object({ n: z.int(), label: z.string(), note: z.string() })).describe('The numbered balloons of the drawing: what feature each points at. Hits of a search carry these numbers.'),
})

/** Names and limits are the table's; they are checked by it. */
export const shopQuerySchema = z.record(z.string(), z.string())

export type ShopList = z.infer<typeof shopListSchema>
export type ShopAnswer = z.infer<typeof shopAnswerSchema>
export type ShopAnswerResult = z.infer<typeof shopResultSchema>
