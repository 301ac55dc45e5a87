// What members, mentors, moderators and stewards do to posts and people.
import { z } from 'zod'
import { basisSchema, replyScopeSchema, resultSchema } from './post'
import { cautionCode, letter, limits, line, optionalParagraph, paragraph, idText } from './text'

export const newRemarkSchema = z.strictObject({ body: paragraph(limits.remark, 'the remark') })

export const newStampSchema = z.strictObject({
  revision: letter,
  basis: basisSchema,
  reference: line(limits.reference, 'the reference: page and step, edition and paragraph, which build and when, or the date of the reply'),
  plansRevision: line(20, 'the revision of the plans page').optional(),
  scope: replyScopeSchema.optional(),
  conflictReason: paragraph(limits.reason, 'the reason').optional(),
}).superRefine((stamp, context) => {
  if (stamp.basis === 'maker-reply' && stamp.scope === undefined) context.addIssue({ code: 'custom', path: ['scope'], message: 'Say for whom the reply holds: bulletin, all kits or one serial.' })
  if (stamp.basis !== 'maker-reply' && stamp.scope !== undefined) context.addIssue({ code: 'custom', path: ['scope'], message: 'Only a kit maker’s reply has a scope.' })
  if (stamp.basis === 'plans' && stamp.plansRevision === undefined) context.addIssue({ code: 'custom', path: ['plansRevision'], message: 'Which revision of the plans page is before you?' })
  if (stamp.basis !== 'plans' && stamp.plansRevision !== undefined) context.addIssue({ code: 'custom', path: ['plansRevision'], message: 'Only a plans step has a plans revision.' })
  if (stamp.scope === 'one-serial') context.addIssue({ code: 'custom', path: ['scope'], message: 'A reply for one serial cannot be stamped: each builder asks for their own.' })
})
export const withdrawStampSchema = z.strictObject({ reason: paragraph(limits.reason, 'the reason') })
export const outcomeInputSchema = z.strictObject({ result: resultSchema, note: optionalParagraph(limits.note).default('') })
  .refine((o) => o.result === 'as-written' || o.note !== '', { path: ['note'], message: 'Say what you changed, or why it did not work.' })
export const relianceInputSchema = z.strictObject({})
export const askForSchema = z.strictObject({ what: z.enum(['photo-with-scale', 'page-and-revision', 'edge-distance', 'which-side']) })
export const addCautionSchema = z.strictObject({ code: cautionCode, because: line(200, 'why') })
export const waiveCautionSchema = z.strictObject({ code: cautionCode, reason: paragraph(limits.reason, 'the reason') })
export const setStateSchema = z.strictObject({ state: z.enum(['visible', 'hidden']), reason: paragraph(limits.reason, 'the reason') })
export const mergeEntrySchema = z.strictObject({ into: idText, reason: paragraph(limits.reason, 'the reason') })
export const setRoleSchema = z.strictObject({ role: z.enum(['member', 'moderator', 'steward']) })
export const setMemberStateSchema = z.strictObject({ state: z.enum(['active', 'suspended']), reason: paragraph(limits.reason, 'the reason') })
export const grantMentorshipSchema = z.strictObject({
  number: z.string().trim().regex(/^[A-Z]{2} [0-9]{3}$/, 'Two capitals, a space and three digits, such as IC 042.'),
  fields: line(200, 'the fields'), reason: paragraph(limits.reason, 'the reason'),
})
export const endMentorshipSchema = z.strictObject({ reason: paragraph(limits.reason, 'the reason') })

export type NewStamp = z.infer<typeof newStampSchema>
export type OutcomeInput = z.infer<typeof outcomeInputSchema>
export type AskFor = z.infer<typeof askForSchema>
