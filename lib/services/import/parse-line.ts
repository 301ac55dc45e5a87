// One line of an import -> a checked entry with its answers, or a refusal in words. Writes nothing.
import 'server-only'
import { AppError } from '@/lib/errors'
import { newEntrySchema, type NewEntry } from '@/lib/schemas/entry-input'
import { importEnvelopeSchema, importNamesSchema, type ImportAnswer } from '@/lib/schemas/import'
import type { z } from 'zod'
import { resolveNames, type NameBook } from './name-book'

export interface ImportedEntry {
  ref: string | null
  author: string | null
  createdAt: number
  stamped: boolean
  entry: NewEntry
  answers: ImportAnswer[]
}

const dayMs = 24 * 3600 * 1000

/**
 * Takes the ImportLine of the interface. Three courtesies to files made elsewhere: `id` is the `ref` when there is none,
 * `section` is the only one of `sections`, and `cautions` is not read, because the rules say which are required.
 * Every other unknown field fails the line.
 */
export function parseLine(known: NameBook, value: unknown, now: number): ImportedEntry {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) throw new AppError('invalid', 'Not a JSON object.')
  const { id, cautions: _cautions, ref = id, type, author, createdAt, stamped, answers, section, ...rest } = value as Record<string, unknown>
  const fields = section === undefined ? rest : 'sections' in rest ? { ...rest, section } : { ...rest, sections: [section] }
  const envelope = checked(importEnvelopeSchema, { type, ref: typeof ref === 'number' ? String(ref) : ref, author, createdAt, stamped, answers })
  const names = resolveNames(known, checked(importNamesSchema, fields))
  const entry = checked(newEntrySchema, names)
  if (entry.kind === 'lesson' && envelope.answers.length > 0) throw new AppError('invalid', 'answers: A lesson takes no answers.')
  if (entry.kind === 'question' && envelope.stamped) throw new AppError('invalid', 'stamped: A question is answered, not stamped.')
  const refs = envelope.answers.flatMap((a) => a.ref ?? [])
  if (new Set(refs).size < refs.length) throw new AppError('invalid', 'answers: Two answers have the same ref.')
  for (const at of [envelope.createdAt, ...envelope.answers.map((a) => a.createdAt)]) {
    if (at !== undefined && (at < 0 || at > now + dayMs)) throw new AppError('invalid', 'createdAt: Before 1970, or still to come.')
  }
  return {
    ref: envelope.ref ?? null, author: envelope.author ?? null, createdAt: Math.min(envelope.createdAt ?? now, now), stamped: envelope.stamped ?? false,
    entry, answers: envelope.answers,
  }
}

function checked<T>(schema: z.ZodType<T>, value: unknown): T {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const words = result.error.issues.slice(0, 3).map((issue) => {
    if (issue.code === 'unrecognized_keys') return `Unknown field ${issue.keys.join(', ').slice(0, 200)}.`
    return issue.path.length ? `${issue.path.join('.')}: ${issue.message}` : issue.message
  })
  throw new AppError('invalid', words.join(' '))
}
