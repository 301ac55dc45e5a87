// A member's own aeroplane as the API and the pages show it, and what its owner sends. Private to its owner, but for a visit sheet.
import { z } from 'zod'
import { minutesBetween, mostMinutes, readHours } from '@/lib/domain/builds/minutes-worked'
import { cautionSchema, stampStateSchema } from './post'
import { line, limits, optionalParagraph, sectionCode, slug } from './text'

/** One line that may be empty. */
const optionalLine = (max: number) => z.string().default('').pipe(optionalParagraph(max)).transform((v) => v.replace(/\s+/g, ' '))
/** Made where something was written, so that what is sent twice is kept once. */
const key = z.string().regex(/^[\w-]{8,64}$/, 'A key has 8 to 64 letters, digits, - or _.')
const day = z.iso.date('Write the day as year, month and day, such as 2026-03-09.')

export const sectionStateSchema = z.enum(['not-begun', 'in-work', 'waiting', 'done'], 'Choose one of: not begun, in work, waiting, done.')
export const newBuildSchema = z.strictObject({ kit: slug, name: line(limits.name, 'a name, such as its registration or what you call it'), serial: optionalLine(40) })
export const setSectionSchema = z.strictObject({ state: sectionStateSchema })

const logFields = { day, page: optionalLine(40), steps: optionalLine(60), helpers: optionalLine(120), line: optionalLine(300) }
const clock = z.string().max(10, 'Write a time of day, such as 19:30.')
const timeFields = { minutes: z.int('Whole minutes.').min(1, 'At least one minute.').max(mostMinutes, 'At most 24 hours in one line.').optional(), hours: z.string().max(20, 'Write hours such as 2.5 or 2:30.').optional(), start: clock.optional(), stop: clock.optional() }
type Times = { minutes?: number | undefined; hours?: string | undefined; start?: string | undefined; stop?: string | undefined }

/** Minutes by whichever way they were given, or which field says what is wrong. */
function minutesOf({ minutes, hours, start, stop }: Times): { minutes: number } | { path: string; message: string } {
  const given = [minutes !== undefined, hours !== undefined, start !== undefined || stop !== undefined].filter(Boolean).length
  if (given === 0) return { path: 'hours', message: 'Write the hours, or when you started and stopped.' }
  if (given > 1) return { path: 'hours', message: 'Write either the hours, or start and stop.' }
  if (minutes !== undefined) return { minutes }
  if (hours !== undefined) {
    const read = readHours(hours)
    return read === null ? { path: 'hours', message: 'Write hours such as 2.5 or 2:30, at most 24.' } : { minutes: read }
  }
  if (start === undefined) return { path: 'start', message: 'Write when you started, such as 19:30.' }
  if (stop === undefined) return { path: 'stop', message: 'Write when you stopped, such as 22:15.' }
  const between = minutesBetween(start, stop)
  return between === null ? { path: 'stop', message: 'Write two different times of day, such as 19:30 and 22:15.' } : { minutes: between }
}

function withMinutes<T extends Times>(given: T, context: z.RefinementCtx): Omit<T, keyof Times> & { minutes: number } {
  const { minutes: _m, hours: _h, start: _a, stop: _o, ...rest } = given
  const found = minutesOf(given)
  if ('minutes' in found) return { ...rest, minutes: found.minutes }
  context.addIssue({ code: 'custom', path: [found.path], message: found.message })
  return z.NEVER
}

/** A line of the log: `minutes`, or `hours` as people write them, or `start` and `stop`. */
export const newLogLineSchema = z.strictObject({ key, ...logFields, ...timeFields }).transform(withMinutes)
export const changeLogLineSchema = z.strictObject({ ...logFields, ...timeFields }).transform(withMinutes)

export const newHoldSchema = z.strictObject({
  key, kind: z.enum(['hold', 'left-open']), what: line(200, 'what is held, such as rib 7, hole 3: do not rivet'), page: optionalLine(40), step: optionalLine(40),
  until: optionalLine(200), notWaiting: optionalLine(200), untilSection: z.string().default('').pipe(z.union([z.literal(''), sectionCode])),
}).superRefine((hold, context) => {
  if (hold.kind === 'hold' && hold.until === '') context.addIssue({ code: 'custom', path: ['until'], message: 'Write what releases it, such as the kit maker’s written reply.' })
  if (hold.kind === 'left-open' && hold.untilSection === '') context.addIssue({ code: 'custom', path: ['untilSection'], message: 'Choose the section until which it stays open.' })
  if (hold.kind === 'hold' && hold.untilSection !== '') context.addIssue({ code: 'custom', path: ['untilSection'], message: 'Only what is left open on purpose waits for a section.' })
})
export const releaseHoldSchema = z.strictObject({ note: line(limits.note, 'what released it: who said so, when, what you found') })
export const closingAnswerSchema = z.strictObject({ isDone: z.boolean(), note: optionalLine(300) })
  .refine((a) => a.isDone || a.note !== '', { path: ['note'], message: 'Not done needs its reason.' })
export const newVisitSchema = z.strictObject({ visitor: line(limits.name, 'whom it is for'), days: z.coerce.number().int('Whole days.').min(1, 'At least one day.').max(60, 'At most 60 days.') })
export const newFindingSchema = z.strictObject({ key, text: line(500, 'what you found, and where') })

const iso = z.iso.datetime()
const kitSchema = z.object({ slug: z.string(), name: z.string() })
export const holdSchema = z.object({
  id: z.int(), number: z.string(), kind: z.enum(['hold', 'left-open']), buildId: z.int(), section: z.object({ code: z.string(), title: z.string() }), what: z.string(), page: z.string(), step: z.string(),
  until: z.string(), notWaiting: z.string(), untilSection: z.string().nullable(), createdAt: iso, released: z.object({ at: iso, note: z.string() }).nullable(), url: z.string(),
})
export const logLineSchema = z.object({ id: z.int(), key: z.string(), day: z.string(), minutes: z.int(), page: z.string(), steps: z.string(), helpers: z.string(), line: z.string() })
/** Advice its owner goes by, never without its cautions. */
export const goneBySchema = z.object({
  postId: z.int(), url: z.string(), kind: z.enum(['lesson', 'answer']), title: z.string(), author: z.string(), revision: z.string(), currentRevision: z.string(), sections: z.array(z.string()),
  state: z.enum(['visible', 'withdrawn']), stamp: stampStateSchema, cautions: z.array(cautionSchema),
  /** A bulletin changed a step it is about, after it was written and looked at. */
  plansChanged: z.boolean(),
})
export const closingLineSchema = z.object({
  id: z.int(), text: z.string(), origin: z.enum(['plans', 'builder', 'inspector']), reference: z.string(), answer: z.object({ isDone: z.boolean(), note: z.string(), at: iso }).nullable(),
})
export const buildSummarySchema = z.object({
  id: z.int(), name: z.string(), serial: z.string(), kit: kitSchema, createdAt: iso, minutes: z.int(), openHolds: z.int(), url: z.string(), states: z.record(sectionStateSchema, z.int()),
})
export const sectionRowSchema = z.object({ code: z.string(), title: z.string(), state: sectionStateSchema, minutes: z.int(), openHolds: z.int(), url: z.string() })
export const buildSchema = buildSummarySchema.extend({ sections: z.array(sectionRowSchema), holds: z.array(holdSchema), leftOpen: z.array(holdSchema), goingBy: z.array(goneBySchema) })
export const buildSectionSchema = z.object({
  build: z.object({ id: z.int(), name: z.string(), serial: z.string(), kit: kitSchema.extend({ maker: z.string() }) }), code: z.string(), title: z.string(), state: sectionStateSchema, minutes: z.int(),
  log: z.array(logLineSchema), holds: z.array(holdSchema), openUntilHere: z.array(holdSchema), goingBy: z.array(goneBySchema), closing: z.array(closingLineSchema),
})

export type SectionState = z.infer<typeof sectionStateSchema>
export type NewBuild = z.output<typeof newBuildSchema>
export type NewLogLine = z.output<typeof newLogLineSchema>
export type ChangeLogLine = z.output<typeof changeLogLineSchema>
export type NewHold = z.output<typeof newHoldSchema>
export type Hold = z.infer<typeof holdSchema>
export type LogLine = z.infer<typeof logLineSchema>
export type GoneBy = z.infer<typeof goneBySchema>
export type ClosingLine = z.infer<typeof closingLineSchema>
export type BuildSummary = z.infer<typeof buildSummarySchema>
export type Build = z.infer<typeof buildSchema>
export type BuildSection = z.infer<typeof buildSectionSchema>
