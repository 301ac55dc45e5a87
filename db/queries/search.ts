// What search reads: the change log and the ids of entries. Text comes through cautioned-post.ts like everywhere else.
import 'server-only'
import { and, asc, desc, eq, gt, isNull, max, sql } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { audit, change, post, setting } from '../schema'

/** The newest sequence of the change log, 0 when nothing was ever written. */
export async function currentSequence(reader: ReaderOrTransaction): Promise<number> {
  const [row] = await reader.select({ sequence: max(change.sequence) }).from(change)
  return row?.sequence ?? 0
}

/** Entries changed after `sequence`, at most `limit` rows of the log, with the sequence reached. */
export async function listChangesAfter(reader: ReaderOrTransaction, sequence: number, limit: number): Promise<{ entryIds: number[]; reached: number }> {
  const rows = await reader.select().from(change).where(gt(change.sequence, sequence)).orderBy(asc(change.sequence)).limit(limit)
  return { entryIds: [...new Set(rows.map((r) => r.postId))], reached: rows.at(-1)?.sequence ?? sequence }
}

/** Ids of visible entries after `afterId`, ascending: the walk that builds an index. */
export async function listVisibleEntryIds(reader: ReaderOrTransaction, afterId: number, limit: number): Promise<number[]> {
  const rows = await reader.select({ id: post.id }).from(post)
    .where(and(isNull(post.parentId), eq(post.state, 'visible'), gt(post.id, afterId))).orderBy(asc(post.id)).limit(limit)
  return rows.map((r) => r.id)
}

/** Ids of entries in any state after `afterId`, ascending. */
export async function listEntryIdsFrom(reader: ReaderOrTransaction, afterId: number, limit: number): Promise<number[]> {
  const rows = await reader.select({ id: post.id }).from(post).where(and(isNull(post.parentId), gt(post.id, afterId))).orderBy(asc(post.id)).limit(limit)
  return rows.map((r) => r.id)
}

/** How many visible entries there are. */
export async function countVisibleEntries(reader: ReaderOrTransaction): Promise<number> {
  const [row] = await reader.select({ n: sql<number>`count(*)` }).from(post).where(and(isNull(post.parentId), eq(post.state, 'visible')))
  return row?.n ?? 0
}

/** Which database this is, copies of it included; empty in one that was last migrated before it was given. */
export async function databaseIdentity(reader: ReaderOrTransaction): Promise<string> {
  const [row] = await reader.select({ value: setting.value }).from(setting).where(eq(setting.key, 'database'))
  return row?.value ?? ''
}

/** The newest row of the audit chain; its hash stands for all that was recorded before. */
export async function auditHead(reader: ReaderOrTransaction): Promise<{ sequence: number; hash: string }> {
  const [row] = await reader.select({ sequence: audit.sequence, hash: audit.hash }).from(audit).orderBy(desc(audit.sequence)).limit(1)
  return row ?? { sequence: 0, hash: '' }
}

/** Whether this database has been where the chain had that row: false in a copy from before, and in one that took another way since. */
export async function hasAuditRow(reader: ReaderOrTransaction, { sequence, hash }: { sequence: number; hash: string }): Promise<boolean> {
  if (sequence === 0) return true
  const [row] = await reader.select({ hash: audit.hash }).from(audit).where(eq(audit.sequence, sequence))
  return row?.hash === hash
}
