// Ids for the first page: what was stamped lately and what is still open.
import 'server-only'
import { and, desc, eq, isNull, notExists, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { post, stamp } from '../schema'
import { isVisible } from './cautioned-post'

const answer = alias(post, 'answer')

/** Posts whose last live stamp is newest, each with its entry's id. */
export async function listLatelyStamped(reader: ReaderOrTransaction, limit: number): Promise<{ entryId: number; postId: number }[]> {
  const rows = await reader.select({ postId: post.id, parentId: post.parentId, at: sql<number>`max(${stamp.createdAt})` }).from(stamp)
    .innerJoin(post, eq(post.id, stamp.postId)).where(and(isVisible, eq(post.stampState, 'stamped'), isNull(stamp.withdrawnAt)))
    .groupBy(post.id).orderBy(desc(sql`3`)).limit(limit)
  return rows.map((r) => ({ entryId: r.parentId ?? r.postId, postId: r.postId }))
}

/** Questions nobody has answered, newest first. */
export async function listOpenQuestions(reader: ReaderOrTransaction, limit: number): Promise<number[]> {
  const rows = await reader.select({ id: post.id }).from(post)
    .where(and(eq(post.kind, 'question'), isVisible, notExists(reader.select({ one: sql`1` }).from(answer).where(and(eq(answer.parentId, post.id), eq(answer.state, 'visible'))))))
    .orderBy(desc(post.createdAt)).limit(limit)
  return rows.map((r) => r.id)
}
