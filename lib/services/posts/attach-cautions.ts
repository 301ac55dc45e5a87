// Which cautions the rules require of a post, and attaching them in the transaction that publishes.
import 'server-only'
import { eq, and } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { postCaution } from '@/db/schema'
import type { CautionedPost } from '@/db/queries/cautioned-post'
import { cautionTable } from '@/lib/content/caution-table'
import { requiredCautions } from '@/lib/domain/cautions/required-cautions'
import type { RequiredCaution } from '@/lib/domain/cautions/rule-table'
import { wholeText } from '@/lib/domain/entries/entry-text'
import { AppError } from '@/lib/errors'

type Revision = CautionedPost['current']

/** What the rules require of an entry's revision. */
export function cautionsOfEntry(kind: 'question' | 'lesson', revision: Pick<Revision, 'title' | 'parts' | 'body' | 'tasks' | 'operations' | 'hardware'>, jasc: readonly string[]): RequiredCaution[] {
  return requiredCautions(cautionTable, {
    title: revision.title, text: wholeText(kind, revision.parts, revision.body), tasks: revision.tasks, operations: revision.operations, hardware: revision.hardware, jasc: [...jasc],
  })
}

/** What the rules require of an answer: its question's place, and the words of both. */
export function cautionsOfAnswer(question: Pick<CautionedPost, 'current' | 'sections' | 'cautions'>, body: string): RequiredCaution[] {
  const { current } = question
  const byRule = requiredCautions(cautionTable, {
    title: current.title, text: `${wholeText('question', current.parts, current.body)}\n\n${body}`,
    tasks: current.tasks, operations: current.operations, hardware: current.hardware, jasc: question.sections.flatMap((s) => s.jasc ?? []),
  })
  return [...byRule, ...standingOn(question.cautions).filter((c) => !byRule.some((r) => r.code === c.code))]
}

/** What stands on a question, by rule or by a moderator: its answers take it too. */
function standingOn(rows: CautionedPost['cautions']): RequiredCaution[] {
  return rows.flatMap((row) => {
    const words = cautionTable.cautions.find((c) => c.code === row.code)
    return words && row.waivedAt === null ? [{ ...words, because: row.because }] : []
  })
}

type Row = typeof postCaution.$inferSelect

/** A waiver was given for one reason; required again for another, the caution stands again. */
const reopened = (rows: readonly Row[], required: readonly RequiredCaution[]) =>
  required.filter((c) => rows.some((r) => r.code === c.code && r.waivedAt !== null && r.because !== c.because))
const unwaived = { waivedAt: null, waivedBy: null, waivedReason: null }

/** The author publishes: what is in force and not yet acknowledged must be acknowledged, else 422 names it. */
export async function acknowledgeCautions(tx: Transaction, postId: number, required: readonly RequiredCaution[], acknowledged: readonly string[], now: number): Promise<void> {
  const rows = await tx.select().from(postCaution).where(eq(postCaution.postId, postId))
  const standing = rows.filter((r) => r.waivedAt === null && r.origin !== 'moderator' && r.acknowledgedAt === null)
  const fresh = required.filter((c) => !rows.some((r) => r.code === c.code))
  const again = reopened(rows, required)
  const open = [...fresh, ...standing, ...again].filter((c) => !acknowledged.includes(c.code))
  if (open.length > 0) {
    const words = (code: string) => cautionTable.cautions.find((c) => c.code === code)
    throw new AppError('invalid', 'Read and acknowledge the cautions first.', {
      errors: open.map((c) => ({ path: `acknowledgedCautions.${c.code}`, message: `Acknowledge: ${words(c.code)?.title ?? c.code} (${c.because}).` })),
      cautions: open.flatMap((c) => { const w = words(c.code); return w ? [{ ...w, because: c.because, origin: 'rule' }] : [] }),
    })
  }
  if (fresh.length) await tx.insert(postCaution).values(fresh.map((c) => ({ postId, code: c.code, origin: 'rule' as const, because: c.because, createdAt: now, acknowledgedAt: now })))
  for (const c of again) await tx.update(postCaution).set({ ...unwaived, origin: 'rule', because: c.because, acknowledgedAt: now }).where(and(eq(postCaution.postId, postId), eq(postCaution.code, c.code)))
  for (const row of standing) await tx.update(postCaution).set({ acknowledgedAt: now }).where(and(eq(postCaution.postId, postId), eq(postCaution.code, row.code)))
}

/** Attaches what is required and not there yet, without the author: by import, or because the question or the rules changed. */
export async function attachCautions(tx: Transaction, postId: number, required: readonly RequiredCaution[], origin: 'rule' | 'added-later', now: number): Promise<number> {
  const rows = await tx.select().from(postCaution).where(eq(postCaution.postId, postId))
  const again = reopened(rows, required)
  for (const c of again) await tx.update(postCaution).set({ ...unwaived, origin, because: c.because, acknowledgedAt: null }).where(and(eq(postCaution.postId, postId), eq(postCaution.code, c.code)))
  const fresh = required.filter((c) => !rows.some((r) => r.code === c.code))
  if (fresh.length) await tx.insert(postCaution).values(fresh.map((c) => ({ postId, code: c.code, origin, because: c.because, createdAt: now, acknowledgedAt: null })))
  return fresh.length + again.length
}
