// What one member has marked on posts: how it went and what they go by.
import 'server-only'
import { and, eq, inArray } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { outcome, reliance } from '../schema'

/** This member's own marks on these posts. */
export async function listOwnMarks(reader: ReaderOrTransaction, memberId: number, postIds: readonly number[]) {
  const ids = [...postIds]
  const [outcomes, reliances] = await Promise.all([
    reader.select().from(outcome).where(and(eq(outcome.memberId, memberId), inArray(outcome.postId, ids))),
    reader.select().from(reliance).where(and(eq(reliance.memberId, memberId), inArray(reliance.postId, ids))),
  ])
  return { outcomes, reliances }
}
