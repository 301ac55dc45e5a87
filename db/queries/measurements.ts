// Which posts still wait for their measurements. The measurements themselves leave with their post (cautioned-post.ts).
import 'server-only'
import { and, asc, gt, lt } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { post } from '../schema'

/** Ids after `afterId`, ascending, of posts last measured by an older parser than `parser`, or by none. */
export async function listUnmeasuredIds(reader: ReaderOrTransaction, parser: number, afterId: number, limit: number): Promise<number[]> {
  const rows = await reader.select({ id: post.id }).from(post).where(and(gt(post.id, afterId), lt(post.measuredBy, parser))).orderBy(asc(post.id)).limit(limit)
  return rows.map((r) => r.id)
}
