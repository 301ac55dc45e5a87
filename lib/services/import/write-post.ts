// Writes one imported text: a new post, or a new revision of a known one, with the cautions it must carry. Inside a transaction.
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { insertPost, insertRevision, type Projections } from '@/db/mutations/posts'
import { stamp, type revision } from '@/db/schema'
import { judgeStamps } from '@/lib/domain/stamps/stamp-state'
import type { RequiredCaution } from '@/lib/domain/cautions/rule-table'
import { attachCautions } from '@/lib/services/posts/attach-cautions'
import type { Rendered } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'

export const unknownAuthor = 'author unknown'

export interface ImportedText {
  kind: 'question' | 'lesson' | 'answer'
  parentId: number | null
  ref: string | null
  author: string | null
  createdAt: number
  stamped: boolean
  /** Current revision of the question; 0 for an entry. */
  questionRevision: number
  judged: Omit<typeof revision.$inferInsert, 'postId' | 'number' | 'contentHash' | 'createdAt'>
  hash: string
  rendered: Rendered | null
  projections: Projections | null
  required: readonly RequiredCaution[]
}
export interface Known { id: number; number: number; contentHash: string }

/** A post that was not there. Its judgement follows from what is about to be written, without reading it back. */
export async function insertImported(tx: Transaction, text: ImportedText, now: number): Promise<{ id: number; number: number }> {
  const needsTwo = text.required.some((c) => c.twoStamps)
  const imported = { revision: 1, questionRevision: text.questionRevision, mentorId: null, basis: 'imported' as const, scope: null, createdAt: now, withdrawnAt: null }
  const { state: stampState } = judgeStamps({
    currentRevision: 1, questionRevision: text.questionRevision, needsTwo, postState: 'visible', authorIds: [], stamps: text.stamped ? [imported] : [], failuresAt: [],
  })
  const { kind, parentId, ref, createdAt } = text
  const id = await insertPost(tx, { kind, parentId, ref, authorName: text.author ?? unknownAuthor, stampState, needsTwo, createdAt })
  await addRevision(tx, id, 1, text, createdAt)
  await attachCautions(tx, id, text.required, 'rule', now)
  if (text.stamped) await addImportedStamp(tx, id, 1, text.questionRevision, now)
  return { id, number: 1 }
}

/** A post that is known: the next revision when its text changed, an imported stamp when it has none yet. Judging is the caller's. */
export async function updateImported(tx: Transaction, known: Known, text: ImportedText, now: number): Promise<{ number: number; changed: boolean }> {
  const revised = known.contentHash !== text.hash
  const number = revised ? known.number + 1 : known.number
  if (revised) {
    await addRevision(tx, known.id, number, text, now)
    await attachCautions(tx, known.id, text.required, 'rule', now)
  }
  const stamped = text.stamped && (await addImportedStamp(tx, known.id, number, text.questionRevision, now))
  return { number, changed: revised || stamped }
}

async function addRevision(tx: Transaction, postId: number, number: number, text: ImportedText, createdAt: number): Promise<void> {
  await insertRevision(tx, { postId, number, authorName: text.author ?? unknownAuthor, ...text.judged, contentHash: text.hash, createdAt }, text.projections)
  if (text.rendered) await saveText(tx, postId, number, text.rendered)
}

/** An imported stamp says that another group stamped this text: below stamped, never one of two. False when it stands already. */
async function addImportedStamp(tx: Transaction, postId: number, revisionNumber: number, questionRevision: number, now: number): Promise<boolean> {
  const standing = await tx.select({ id: stamp.id }).from(stamp)
    .where(and(eq(stamp.postId, postId), eq(stamp.revision, revisionNumber), eq(stamp.questionRevision, questionRevision), eq(stamp.basis, 'imported'), isNull(stamp.withdrawnAt)))
  if (standing.length > 0) return false
  await tx.insert(stamp).values({ postId, revision: revisionNumber, questionRevision, mentorId: null, mark: 'imported', basis: 'imported', reference: 'Stamped where it was imported from', createdAt: now })
  return true
}
