// "Ask for" is answered when the author of the post, or of its question, edits it or remarks under it: the post hangs on the rail again.
import 'server-only'
import { and, eq, inArray, isNull } from 'drizzle-orm'
import type { Transaction } from '@/db/client'
import { listAnswerIds } from '@/db/queries/cautioned-post'
import { askedFor, post } from '@/db/schema'

/** Closes what was asked for on `postId` (and, for a question, on its answers) when `memberId` wrote it. */
export async function answerRequests(tx: Transaction, postId: number, memberId: number, now: number): Promise<void> {
  const [row] = await tx.select({ authorId: post.authorId, parentId: post.parentId, kind: post.kind }).from(post).where(eq(post.id, postId))
  if (!row) return
  const [question] = row.parentId === null ? [] : await tx.select({ authorId: post.authorId }).from(post).where(eq(post.id, row.parentId))
  if (memberId !== row.authorId && memberId !== question?.authorId) return
  const answers = row.kind === 'question' ? (await listAnswerIds(tx, [postId])).map((a) => a.id) : []
  await tx.update(askedFor).set({ answeredAt: now }).where(and(inArray(askedFor.postId, [postId, ...answers]), isNull(askedFor.answeredAt)))
}
