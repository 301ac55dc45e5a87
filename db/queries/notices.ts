// What waits for members, and who goes by a post. Text of the posts comes from cautioned-post.ts like everywhere else.
import 'server-only'
import { and, count, desc, eq, isNull, lt, ne } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { bulletin, kit, member, notice, reliance } from '../schema'
import { oneOf } from './one-of'

const isOpenFor = (memberId: number) => and(eq(notice.memberId, memberId), isNull(notice.closedAt))

/** How many notices wait for this member. */
export async function countOpenNotices(reader: ReaderOrTransaction, memberId: number): Promise<number> {
  const [row] = await reader.select({ n: count() }).from(notice).where(isOpenFor(memberId))
  return row?.n ?? 0
}

/** Open notices of a member, the newest first, before the id `before`. */
export async function listOpenNotices(reader: ReaderOrTransaction, memberId: number, { limit, before }: { limit: number; before?: number | undefined }) {
  return reader.select({ notice, bulletin, kit: { slug: kit.slug } }).from(notice).leftJoin(bulletin, eq(bulletin.id, notice.bulletinId)).leftJoin(kit, eq(kit.id, bulletin.kitId))
    .where(and(isOpenFor(memberId), before === undefined ? undefined : lt(notice.id, before))).orderBy(desc(notice.id)).limit(limit)
}

/** One notice with its bulletin, or null. */
export async function getNotice(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ notice, bulletin, kit: { slug: kit.slug } }).from(notice).leftJoin(bulletin, eq(bulletin.id, notice.bulletinId)).leftJoin(kit, eq(kit.id, bulletin.kitId)).where(eq(notice.id, id))
  return row ?? null
}
export type NoticeRow = NonNullable<Awaited<ReturnType<typeof getNotice>>>

/** Who goes by these posts, on whatever revision; closed accounts are left out. */
export async function listFollowers(reader: ReaderOrTransaction, postIds: readonly number[]): Promise<{ postId: number; memberId: number }[]> {
  return reader.select({ postId: reliance.postId, memberId: reliance.memberId }).from(reliance).innerJoin(member, eq(member.id, reliance.memberId))
    .where(and(oneOf(reliance.postId, postIds), ne(member.state, 'closed'))).orderBy(reliance.postId, reliance.memberId)
}
