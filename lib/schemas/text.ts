// Building blocks of every request schema: trimmed text with limits, slugs, ids, revision letters.
import { z } from 'zod'
import { normalizeText } from '@/lib/domain/markdown/normalize-text'

/** Limits of model.md, in UTF-16 code units. */
export const limits = { title: 160, part: 5_000, body: 20_000, remark: 2_000, note: 1_000, reference: 300, reason: 1_000, name: 80, query: 500, list: 30 } as const

// Control characters other than tab and line feed never carry meaning in what people write; they are refused, not hidden.
const forbiddenControls = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/
const clean = z.string().refine((value) => !forbiddenControls.test(value), 'Control characters are not allowed.')

/** One line: trimmed, no line feeds. */
export const line = (max: number, what: string) => clean.transform((v) => normalizeText(v).replace(/\s+/g, ' ').trim())
  .pipe(z.string().min(1, `Write ${what}.`).max(max, `At most ${max} characters.`))

/** Several lines that must say something. */
export const paragraph = (max: number, what: string) => clean.transform((v) => normalizeText(v).trim())
  .pipe(z.string().min(1, `Write ${what}.`).max(max, `At most ${max.toLocaleString('en')} characters.`))

/** Several lines that may be empty. */
export const optionalParagraph = (max: number) => clean.transform((v) => normalizeText(v).trim())
  .pipe(z.string().max(max, `At most ${max.toLocaleString('en')} characters.`))

export const slug = z.string().regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, 'Not a known name.').max(60)
export const sectionCode = z.string().regex(/^[A-Za-z0-9][A-Za-z0-9.-]{0,11}$/, 'Not a section code.')
export const letter = z.string().regex(/^[A-Z]{1,4}$/, 'A revision is a letter such as A, B or AA.')
/** An id in an address or a request. */
export const id = z.int().positive()
export const idText = z.string().regex(/^[1-9][0-9]{0,14}$/).transform(Number)
export const cautionCode = z.string().regex(/^[a-z0-9-]{1,60}$/, 'Not a caution code.')
