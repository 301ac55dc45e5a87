// A section's brief as the page, the print and the API show it. Whatever carries words of a post carries its cautions beside them.
import { z } from 'zod'
import { BASES } from '@/lib/domain/shop/shop-table'
import { cautionSchema, outcomesSchema, planChangeSchema, plansReferenceSchema, stampSchema, stampStateSchema } from './post'

const cautions = z.array(cautionSchema)
const taskName = z.object({ slug: z.string(), title: z.string() })
const person = z.object({ id: z.int().optional(), name: z.string() })
const postLinkSchema = z.object({ postId: z.int(), title: z.string(), url: z.string(), cautions })
const briefItemSchema = z.object({
  postId: z.int(), kind: z.enum(['question', 'lesson', 'answer']), title: z.string(), passage: z.string(), url: z.string(), author: person, revision: z.string(),
  stamp: stampStateSchema, missing: z.enum(['first', 'second', 'firm-basis']).nullable(), needsTwo: z.boolean(), stamps: z.array(stampSchema), outcomes: outcomesSchema, cautions,
  /** Where a bulletin changed the plans since it was written and looked at. */
  planChanges: z.array(planChangeSchema),
})
const briefSizeSchema = z.object({
  claim: z.string(), expected: z.string(), table: z.string(), tableTitle: z.string(), url: z.string(),
  source: z.object({ title: z.string(), section: z.string(), year: z.string() }).nullable(), basis: z.enum(BASES), posts: z.array(postLinkSchema), cautions,
})
const saidSchema = z.object({ before: taskName, after: taskName, builders: z.int(), posts: z.array(postLinkSchema) })
const briefTaskSchema = z.object({
  ...taskName.shape, isInPlans: z.boolean(), steps: z.array(plansReferenceSchema), cautions,
  sizes: z.array(briefSizeSchema), knowHow: z.array(briefItemSchema),
  lessons: z.array(z.object({ lead: briefItemSchema, builders: z.int(), others: z.array(postLinkSchema), cautions })), open: z.array(briefItemSchema),
})
export const briefSchema = z.object({
  kit: z.object({ slug: z.string(), name: z.string(), maker: z.string() }),
  section: z.object({ code: z.string(), title: z.string(), jasc: z.string().nullable() }),
  url: z.string(), preparedAt: z.iso.datetime(), plansWin: z.string(), cautions,
  order: z.object({
    tasks: z.array(z.string()), hasBaseLine: z.boolean(), builders: z.int(), ownBuilders: z.int(),
    otherKits: z.array(z.object({ kit: z.string(), section: z.string(), title: z.string(), builders: z.int() })),
    departures: z.array(saidSchema),
    disagreements: z.array(z.object({ kind: z.enum(['both-ways', 'ring']), tasks: z.array(taskName), sides: z.array(saidSchema), followed: z.object({ before: z.string(), after: z.string() }).nullable() })),
    /** Of two tasks that follow one another: how many builders say so. */
    straightOn: z.array(z.object({ before: z.string(), after: z.string(), builders: z.int() })),
  }),
  /** In working order, then those that nobody has placed. */
  tasks: z.array(briefTaskSchema), unplaced: z.array(briefTaskSchema),
  hours: z.object({ builders: z.int(), lower: z.number(), median: z.number(), upper: z.number(), least: z.number(), most: z.number(), points: z.array(z.number()).nullable() }).nullable(),
  tools: z.array(z.object({ name: z.string(), builders: z.int(), cautions })),
  closing: z.array(z.object({ text: z.string(), origin: z.enum(['plans', 'builder', 'inspector']), reference: z.string() })),
  postsLeftOut: z.int(),
})

export type Brief = z.infer<typeof briefSchema>
export type BriefTask = z.infer<typeof briefTaskSchema>
export type BriefItem = z.infer<typeof briefItemSchema>
export type BriefSize = z.infer<typeof briefSizeSchema>
export type PostLink = z.infer<typeof postLinkSchema>
export type Said = z.infer<typeof saidSchema>
