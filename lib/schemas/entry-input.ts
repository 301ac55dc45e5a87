// What an author sends: a new entry, an edit, an answer. One shape for the API and, through a form reader, for the pages.
import { z } from 'zod'
import { cautionCode, letter, limits, line, optionalParagraph, paragraph, sectionCode, slug } from './text'
import { replyScopeSchema } from './post'

const plansReference = z.strictObject({
  page: z.string().trim().min(1, 'Which page?').max(40),
  step: z.string().trim().min(1).max(20).optional(),
  revision: z.string().trim().min(1).max(20).optional(),
})
const orderAdvice = z.strictObject({ before: slug, after: slug }).refine((o) => o.before !== o.after, 'A task cannot come before itself.')
export const questionPartsSchema = z.strictObject({
  doing: optionalParagraph(limits.part).default(''), plansSay: optionalParagraph(limits.part).default(''),
  measured: optionalParagraph(limits.part).default(''), tried: optionalParagraph(limits.part).default(''),
})
export const lessonPartsSchema = z.strictObject({
  happened: optionalParagraph(limits.part).default(''), differently: optionalParagraph(limits.part).default(''),
  tools: optionalParagraph(limits.part).default(''), hours: z.number().min(0).max(10_000).optional(),
})

const common = {
  kit: slug,
  sections: z.array(sectionCode).min(1, 'Pick the section.').max(limits.list),
  tasks: z.array(slug).max(limits.list).default([]),
  operations: z.array(slug).max(limits.list).default([]),
  hardware: z.array(line(80, 'the hardware')).max(limits.list).default([]),
  plans: z.array(plansReference).max(limits.list).default([]),
  title: line(limits.title, 'a title'),
  body: paragraph(limits.body, 'the text').optional(),
  orderAdvice: z.array(orderAdvice).max(limits.list).default([]),
  acknowledgedCautions: z.array(cautionCode).max(100).default([]),
}

/** A text is either its parts or one body, and says something either way. */
function saysSomething(entry: { parts?: Record<string, unknown> | undefined; body?: string | undefined }, context: z.RefinementCtx) {
  const partsSay = entry.parts !== undefined && Object.values(entry.parts).some((v) => typeof v === 'string' && v !== '')
  if (entry.parts !== undefined && entry.body !== undefined) context.addIssue({ code: 'custom', path: ['body'], message: 'Send parts or body, not both.' })
  else if (!partsSay && entry.body === undefined) context.addIssue({ code: 'custom', path: ['parts'], message: 'Say what it is about: at least one part needs text.' })
}

export const newEntrySchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('question'), ...common, parts: questionPartsSchema.optional() }),
  z.strictObject({ kind: z.literal('lesson'), ...common, parts: lessonPartsSchema.optional() }),
]).superRefine(saysSomething)

/** Any subset of a new entry, with the revision one started from. The kind never changes. */
export const entryEditSchema = z.strictObject({
  revision: letter,
  /** May be repeated from the entry; it never changes. */
  kind: z.enum(['question', 'lesson']).optional(),
  kit: common.kit.optional(), sections: common.sections.optional(), tasks: z.array(slug).max(limits.list).optional(),
  operations: z.array(slug).max(limits.list).optional(), hardware: z.array(line(80, 'the hardware')).max(limits.list).optional(),
  plans: z.array(plansReference).max(limits.list).optional(), title: common.title.optional(), body: common.body,
  parts: z.union([questionPartsSchema, lessonPartsSchema]).optional(),
  orderAdvice: z.array(orderAdvice).max(limits.list).optional(), acknowledgedCautions: common.acknowledgedCautions,
})

const answerShape = {
  body: paragraph(limits.body, 'what to do'),
  acknowledgedCautions: common.acknowledgedCautions,
  /** Set when the answer passes on a kit maker's written reply: for whom it holds. */
  makerReply: replyScopeSchema.optional(),
}
export const newAnswerSchema = z.strictObject(answerShape)
/** `makerReply: 'none'` takes the scope off; left out it stays. */
export const answerEditSchema = z.strictObject({ ...answerShape, makerReply: z.union([replyScopeSchema, z.literal('none')]).optional(), revision: letter })

export type NewEntry = z.infer<typeof newEntrySchema>
export type EntryEdit = z.infer<typeof entryEditSchema>
export type NewAnswer = z.infer<typeof newAnswerSchema>
export type AnswerEdit = z.infer<typeof answerEditSchema>
