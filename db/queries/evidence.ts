// When questions were asked and first answered: moments only, no text.
import 'server-only'
import { and, asc, eq, isNull, sql } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { post } from '../schema'
import { isVisible } from './cautioned-post'

/** Every visible question, oldest first; `answeredAt` is its first visible answer, null while there is none. */
export async function listAnswerTimes(reader: ReaderOrTransaction): Promise<{ askedAt: number; answeredAt: number | null }[]> {
  // Spelled out: in a select from one table the builder leaves the table's name away, and inside `id` would be the answer's own.
  const first = sql<number | null>`(select min(a.created_at) from post a where a.parent_id = post.id and a.state = 'visible')`
  return reader.select({ askedAt: post.createdAt, answeredAt: first }).from(post)
    .where(and(isVisible, isNull(post.parentId), eq(post.kind, 'question'))).orderBy(asc(post.createdAt))
}
