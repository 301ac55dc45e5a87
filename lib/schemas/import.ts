// A line of an import and what an import answers. The entry in a line is a NewEntry (entry-input.ts) whose names may be
// titles, in any case; lib/services/import turns them into slugs before that schema sees them.
import { z } from 'zod'
import { limits, line, paragraph } from './text'

export const importMaxBytes = 64_000_000
export const importTypes = ['application/x-ndjson', 'application/jsonl', 'text/plain'] as const

const ref = line(200, 'the ref')
const author = line(limits.name, 'the author')
/** A day or a moment, ISO 8601. */
const moment = z.union([z.iso.datetime({ offset: true }), z.iso.date()], 'Not an ISO 8601 date such as 2024-05-01T18:30:00Z.').transform((v) => Date.parse(v))
const name = z.string().trim().min(1, 'Empty name.').max(200, 'At most 200 characters.')
const names = z.array(name).max(limits.list)

export const importAnswerSchema = z.strictObject({
  ref: ref.optional(), body: paragraph(limits.body, 'what to do'), author: author.optional(), createdAt: moment.optional(), stamped: z.boolean().optional(),
})

/** What a line says about an entry beyond the entry itself. */
export const importEnvelopeSchema = z.object({
  type: z.literal('entry', 'Only lines of type entry can be imported yet.').optional(),
  ref: ref.optional(), author: author.optional(), createdAt: moment.optional(), stamped: z.boolean().optional(),
  answers: z.array(importAnswerSchema).max(200, 'At most 200 answers.').default([]),
})

/** The names of a line, by slug, code or title in any case. Other fields pass through to the entry's own schema. */
export const importNamesSchema = z.looseObject({
  kit: name, sections: names.min(1, 'Name the section.'), tasks: names.optional(), operations: names.optional(),
  orderAdvice: z.array(z.looseObject({ before: name, after: name })).max(limits.list).optional(),
})

export const importResultSchema = z.object({
  imported: z.int(), updated: z.int(), unchanged: z.int(),
  /** Lines are counted from 1, blank ones included. */
  failed: z.array(z.object({ line: z.int(), message: z.string() })),
})

export type ImportAnswer = z.infer<typeof importAnswerSchema>
export type ImportEnvelope = z.infer<typeof importEnvelopeSchema>
export type ImportNames = z.infer<typeof importNamesSchema>
export type ImportResult = z.infer<typeof importResultSchema>
