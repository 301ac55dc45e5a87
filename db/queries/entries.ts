// Lists of visible entries by filter, newest first. Ids only: text comes through cautioned-post.ts.
import 'server-only'
import { and, count, desc, eq, exists, isNull, lt, or, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { kit, operation, post, postOperation, postSection, section } from '../schema'
import { isVisible } from './cautioned-post'

export interface EntryFilters {
  kit?: string | undefined
  section?: string | undefined
  operation?: string | undefined
  kind?: 'question' | 'lesson' | undefined
  stamped?: boolean | undefined
}

const answer = alias(post, 'answer')

function matching(reader: ReaderOrTransaction, f: EntryFilters): SQL | undefined {
  const inSection = f.kit ? exists(reader.select({ one: sql`1` }).from(postSection).innerJoin(section, eq(section.id, postSection.sectionId)).innerJoin(kit, eq(kit.id, section.kitId))
    .where(and(eq(postSection.postId, post.id), eq(kit.slug, f.kit), f.section ? eq(section.code, f.section) : undefined))) : undefined
  const withOperation = f.operation ? exists(reader.select({ one: sql`1` }).from(postOperation).innerJoin(operation, eq(operation.id, postOperation.operationId))
    .where(and(eq(postOperation.postId, post.id), eq(operation.slug, f.operation)))) : undefined
  const stamped = f.stamped ? or(eq(post.stampState, 'stamped'), exists(reader.select({ one: sql`1` }).from(answer)
    .where(and(eq(answer.parentId, post.id), eq(answer.state, 'visible'), eq(answer.stampState, 'stamped'))))) : undefined
  return and(isNull(post.parentId), isVisible, f.kind ? eq(post.kind, f.kind) : undefined, inSection, withOperation, stamped)
}

/** A page of ids, newest first, by offset (for the results page without words). */
export async function listEntryIds(reader: ReaderOrTransaction, filters: EntryFilters, page: { limit: number; offset: number }): Promise<number[]> {
  const rows = await reader.select({ id: post.id }).from(post).where(matching(reader, filters)).orderBy(desc(post.createdAt), desc(post.id)).limit(page.limit).offset(page.offset)
  return rows.map((r) => r.id)
}

/** A page of ids after a cursor, newest first. */
export async function listEntryIdsAfter(reader: ReaderOrTransaction, filters: EntryFilters, page: { limit: number; after: { createdAt: number; id: number } | null }) {
  const { after } = page
  const older = after ? or(lt(post.createdAt, after.createdAt), and(eq(post.createdAt, after.createdAt), lt(post.id, after.id))) : undefined
  return reader.select({ id: post.id, createdAt: post.createdAt }).from(post).where(and(matching(reader, filters), older)).orderBy(desc(post.createdAt), desc(post.id)).limit(page.limit)
}

export async function countEntries(reader: ReaderOrTransaction, filters: EntryFilters): Promise<number> {
  const [row] = await reader.select({ n: count() }).from(post).where(matching(reader, filters))
  return row?.n ?? 0
}

/** The entry that a merged one leads to, or null. */
export async function findMergedInto(reader: ReaderOrTransaction, id: number): Promise<number | null> {
  const [row] = await reader.select({ into: post.mergedIntoId }).from(post).where(and(eq(post.id, id), eq(post.state, 'merged')))
  return row?.into ?? null
}
