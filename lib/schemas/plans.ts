// What a steward keeps of the plans: plan steps, bulletins, hardware list and closing items. Places and counts, never the plans' own text.
import { z } from 'zod'
import { limits, line, sectionCode, slug } from './text'

export const maxLines = 500
const page = line(40, 'the page')
const short = (max: number) => line(max, 'something').optional()
const count = z.string().trim().regex(/^[0-9]{1,5}$/, 'A whole number, such as 12.').transform(Number)
const maybe = <T extends z.ZodType>(schema: T) => z.preprocess((v) => (typeof v === 'string' && v.trim() === '' ? undefined : v), schema.optional())

/** Where the lines go: a section of a kit. */
export const sectionPlace = z.object({ kit: slug, section: sectionCode })

export const planStepSchema = z.strictObject({
  page, step: line(20, 'the step'), revision: maybe(short(20)), task: maybe(z.string().trim().toLowerCase().pipe(slug)),
})
export const hardwareItemSchema = z.strictObject({
  designation: line(60, 'the designation'), length: maybe(short(40)), left: count, right: count, place: maybe(short(limits.reference)),
})
export const closingItemSchema = z.strictObject({
  text: line(limits.reference, 'what can no longer be reached'),
  origin: z.string().trim().toLowerCase().pipe(z.enum(['plans', 'builder', 'inspector'], 'plans, builder or inspector.')),
  reference: maybe(short(limits.reference)),
})

/** `add` puts the lines after those there, `replace` in their place. */
export const linesSchema = z.object({ mode: z.enum(['add', 'replace']), lines: z.string().max(100_000, 'At most 100,000 characters at once.') })

const calendarDay = z.string().trim().regex(/^\d{4}-\d{2}-\d{2}$/, 'A date such as 2026-11-30.')
  .refine((d) => !Number.isNaN(Date.parse(d)) && new Date(d).toISOString().slice(0, 10) === d, 'There is no such day.')
export const bulletinPlaceSchema = z.strictObject({ page, step: maybe(short(20)), revision: maybe(short(20)) })
export const newBulletinSchema = z.strictObject({
  number: line(30, 'its number, such as SB-3'), issuedOn: calendarDay, serials: line(120, 'the serials as printed, or "all"'),
  summary: line(limits.reference, 'one line in our own words'),
  steps: z.array(bulletinPlaceSchema).min(1, 'Name at least one page.').max(100, 'At most 100 pages and steps.'),
})

export type PlanStepInput = z.infer<typeof planStepSchema>
export type HardwareItemInput = z.infer<typeof hardwareItemSchema>
export type ClosingItemInput = z.infer<typeof closingItemSchema>
export type NewBulletin = z.infer<typeof newBulletinSchema>
export type LinesMode = z.infer<typeof linesSchema>['mode']
