// The post as the API and the pages show it. Requests that change posts stand in entry-input.ts and acts.ts.
import { z } from 'zod'
import { CAUTION_TOPICS } from '@/lib/domain/cautions/rule-table'
import { stampStates, bases, replyScopes } from '@/lib/domain/stamps/stamp-state'
import { measurementSchema } from './measurement'

export const stampStateSchema = z.enum(stampStates)
export const basisSchema = z.enum(bases)
export const replyScopeSchema = z.enum(replyScopes)
export const resultSchema = z.enum(['as-written', 'with-change', 'did-not-work'])
export const isoMoment = z.iso.datetime()
export const person = z.object({ id: z.int().optional(), name: z.string() })

export const cautionSchema = z.object({
  code: z.string(), signalWord: z.enum(['WARNING', 'CAUTION', 'NOTICE']), topic: z.enum(CAUTION_TOPICS), title: z.string(), text: z.string(),
  short: z.string(), because: z.string(), twoStamps: z.boolean(), origin: z.enum(['rule', 'moderator', 'added-later']),
  waived: z.object({ at: isoMoment, reason: z.string() }).optional(),
})
export const stampSchema = z.object({
  id: z.int(), revision: z.string(), mentor: z.object({ id: z.int(), mark: z.string() }), basis: basisSchema, reference: z.string(),
  plansRevision: z.string().optional(), scope: replyScopeSchema.optional(), conflictReason: z.string().optional(), createdAt: isoMoment,
  withdrawn: z.object({ at: isoMoment, reason: z.string() }).optional(), live: z.boolean(),
})
export const outcomeItemSchema = z.object({ author: person, revision: z.string(), result: resultSchema, note: z.string(), createdAt: isoMoment })
export const outcomesSchema = z.object({
  asWritten: z.int(), withChange: z.int(), didNotWork: z.int(), items: z.array(outcomeItemSchema),
})
export const remarkSchema = z.object({ id: z.int(), author: person, html: z.string(), text: z.string(), createdAt: isoMoment, cautions: z.array(cautionSchema) })
export const plansReferenceSchema = z.object({ page: z.string(), step: z.string().optional(), revision: z.string().optional() })
export const orderAdviceSchema = z.object({ before: z.string(), after: z.string() })

const postShape = {
  id: z.int(), kind: z.enum(['question', 'lesson', 'answer']), parentId: z.int().optional(), ref: z.string().optional(), revision: z.string(), author: person,
  createdAt: isoMoment, updatedAt: isoMoment, html: z.string(), text: z.string(), measurements: z.array(measurementSchema),
  cautions: z.array(cautionSchema), stamp: stampStateSchema, missing: z.enum(['first', 'second', 'firm-basis']).nullable(), stamps: z.array(stampSchema), needsTwo: z.boolean(),
  outcomes: outcomesSchema, goingByThis: z.int(), remarks: z.array(remarkSchema),
  revisions: z.array(z.object({ revision: z.string(), author: person, createdAt: isoMoment })),
  state: z.enum(['visible', 'hidden', 'merged', 'withdrawn']),
}
export const postSchema = z.object(postShape)
export const answerSchema = z.object({ ...postShape, kind: z.literal('answer'), parentId: z.int(), makerReply: replyScopeSchema.optional() })
export const partsSchema = z.record(z.string(), z.union([z.string(), z.number()]))
export const entrySchema = z.object({
  ...postShape, kind: z.enum(['question', 'lesson']), title: z.string(), kit: z.string(), sections: z.array(z.string()), tasks: z.array(z.string()),
  operations: z.array(z.string()), hardware: z.array(z.string()), plans: z.array(plansReferenceSchema), parts: partsSchema.nullable(), body: z.string(),
  orderAdvice: z.array(orderAdviceSchema), answers: z.array(answerSchema), url: z.string(),
})

export type Caution = z.infer<typeof cautionSchema>
export type Stamp = z.infer<typeof stampSchema>
export type Outcomes = z.infer<typeof outcomesSchema>
export type Remark = z.infer<typeof remarkSchema>
export type Post = z.infer<typeof postSchema>
export type Answer = z.infer<typeof answerSchema>
export type Entry = z.infer<typeof entrySchema>
