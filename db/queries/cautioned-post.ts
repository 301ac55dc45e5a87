// The only door through which a post's text leaves the database: always with its cautions, always with its evidence.
// A fixed number of queries, whatever the number of posts.
import 'server-only'
import { and, asc, count, eq, inArray, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { kit, member, outcome, post, postCaution, reliance, remark, rendering, revision, section, stamp } from '../schema'

declare const cautioned: unique symbol
type Row<T extends { $inferSelect: object }> = T['$inferSelect']

export interface PersonName { id: number | null; name: string }
export interface SectionOfPost { code: string; title: string; jasc: string | null }

/** A post with its current text. The brand can only be given here, so no query can hand out text without cautions. */
export interface CautionedPost {
  readonly [cautioned]: true
  id: number
  kind: 'question' | 'lesson' | 'answer'
  parentId: number | null
  ref: string | null
  state: Row<typeof post>['state']
  stateReason: string | null
  stampState: Row<typeof post>['stampState']
  needsTwo: boolean
  createdAt: number
  updatedAt: number
  author: PersonName
  /** Everybody who wrote a revision. */
  authorIds: number[]
  /** The current revision, with its text. */
  current: Row<typeof revision>
  kit: { slug: string; name: string; maker: string } | null
  sections: SectionOfPost[]
  revisions: { number: number; author: PersonName; createdAt: number }[]
  cautions: Row<typeof postCaution>[]
  stamps: Row<typeof stamp>[]
  stampMentors: Map<number, string>
  outcomes: { memberId: number; author: string; revision: number; result: Row<typeof outcome>['result']; note: string; createdAt: number }[]
  goingByThis: number
  remarks: { id: number; author: PersonName; body: string; createdAt: number }[]
  rendering: Row<typeof rendering> | null
}

/** The one predicate of what may stand as advice in a list. */
export const isVisible = eq(post.state, 'visible')

/** Key of a revision's row in `rendering`. */
export const renderingKey = (postId: number, number: number) => `post:${postId}:${number}`
export const remarkRenderingKey = (remarkId: number) => `remark:${remarkId}`

/** Posts by id with everything that hangs on them, in the order of `ids`; unknown ids are left out. */
export async function listCautionedPosts(reader: ReaderOrTransaction, ids: readonly number[]): Promise<CautionedPost[]> {
  const found = new Map<number, CautionedPost>()
  // SQLite takes at most 32,766 variables; pieces keep every statement well below.
  for (let start = 0; start < ids.length; start += 500) await loadInto(found, reader, ids.slice(start, start + 500))
  return ids.flatMap((id) => found.get(id) ?? [])
}

/** One post, or null. */
export async function getCautionedPost(reader: ReaderOrTransaction, id: number): Promise<CautionedPost | null> {
  return (await listCautionedPosts(reader, [id]))[0] ?? null
}

/** Ids of a question's answers, oldest first, whatever their state. */
export async function listAnswerIds(reader: ReaderOrTransaction, questionIds: readonly number[]): Promise<{ id: number; parentId: number | null }[]> {
  if (questionIds.length === 0) return []
  return reader.select({ id: post.id, parentId: post.parentId }).from(post).where(inArray(post.parentId, [...questionIds])).orderBy(asc(post.id))
}

const writer = alias(member, 'writer')

async function loadInto(found: Map<number, CautionedPost>, reader: ReaderOrTransaction, ids: readonly number[]): Promise<void> {
  if (ids.length === 0) return
  const list = [...ids]
  const posts = await reader
    .select({ post, current: revision, kit: { slug: kit.slug, name: kit.name, maker: kit.maker }, authorName: writer.name, rendering })
    .from(post)
    .innerJoin(revision, and(eq(revision.postId, post.id), eq(revision.number, post.currentRevision)))
    .leftJoin(kit, eq(kit.id, revision.kitId))
    .leftJoin(writer, eq(writer.id, post.authorId))
    .leftJoin(rendering, eq(rendering.key, sql`'post:' || ${post.id} || ':' || ${post.currentRevision}`))
    .where(inArray(post.id, list))
  const [revisions, cautions, stamps, outcomes, reliances, remarks, sections] = await Promise.all([
    reader.select({ postId: revision.postId, number: revision.number, authorId: revision.authorId, authorName: revision.authorName, name: member.name, createdAt: revision.createdAt })
      .from(revision).leftJoin(member, eq(member.id, revision.authorId)).where(inArray(revision.postId, list)).orderBy(asc(revision.number)),
    reader.select().from(postCaution).where(inArray(postCaution.postId, list)),
    reader.select({ stamp, name: member.name }).from(stamp).leftJoin(member, eq(member.id, stamp.mentorId)).where(inArray(stamp.postId, list)).orderBy(asc(stamp.id)),
    reader.select({ postId: outcome.postId, memberId: outcome.memberId, author: member.name, revision: outcome.revision, result: outcome.result, note: outcome.note, createdAt: outcome.createdAt })
      .from(outcome).innerJoin(member, eq(member.id, outcome.memberId)).where(inArray(outcome.postId, list)).orderBy(asc(outcome.createdAt)),
    reader.select({ postId: reliance.postId, n: count() }).from(reliance).where(inArray(reliance.postId, list)).groupBy(reliance.postId),
    reader.select({ remark, name: member.name }).from(remark).leftJoin(member, eq(member.id, remark.authorId))
      .where(and(inArray(remark.postId, list), eq(remark.state, 'visible'))).orderBy(asc(remark.id)),
    reader.select({ kitId: section.kitId, code: section.code, title: section.title, jasc: section.jasc }).from(section)
      .where(inArray(section.kitId, posts.flatMap((p) => p.current.kitId ?? []))),
  ])
  for (const row of posts) {
    const of = <T extends { postId: number }>(rows: T[]) => rows.filter((r) => r.postId === row.post.id)
    const own = of(revisions)
    found.set(row.post.id, {
      id: row.post.id, kind: row.post.kind, parentId: row.post.parentId, ref: row.post.ref, state: row.post.state,
      stateReason: row.post.stateReason, stampState: row.post.stampState, needsTwo: row.post.needsTwo,
      createdAt: row.post.createdAt, updatedAt: row.post.updatedAt,
      author: { id: row.post.authorId, name: row.authorName ?? row.post.authorName ?? 'former member' },
      authorIds: [...new Set(own.flatMap((r) => r.authorId ?? []))],
      current: row.current, kit: row.kit,
      sections: row.current.sections.flatMap((code) => sections.find((s) => s.kitId === row.current.kitId && s.code === code) ?? []),
      revisions: own.map((r) => ({ number: r.number, author: { id: r.authorId, name: r.name ?? r.authorName ?? 'former member' }, createdAt: r.createdAt })),
      cautions: of(cautions),
      stamps: stamps.map((s) => s.stamp).filter((s) => s.postId === row.post.id),
      stampMentors: new Map(stamps.flatMap((s) => (s.stamp.mentorId !== null ? [[s.stamp.mentorId, s.name ?? 'former member'] as const] : []))),
      outcomes: of(outcomes),
      goingByThis: of(reliances)[0]?.n ?? 0,
      remarks: remarks.filter((r) => r.remark.postId === row.post.id)
        .map((r) => ({ id: r.remark.id, author: { id: r.remark.authorId, name: r.name ?? r.remark.authorName ?? 'former member' }, body: r.remark.body, createdAt: r.remark.createdAt })),
      rendering: row.rendering,
    } as unknown as CautionedPost)
  }
}

/** A post with every revision's text: history leaves with its cautions like everything else. */
export async function getCautionedHistory(reader: ReaderOrTransaction, id: number): Promise<{ found: CautionedPost; history: Row<typeof revision>[] } | null> {
  const found = await getCautionedPost(reader, id)
  if (!found) return null
  return { found, history: await reader.select().from(revision).where(eq(revision.postId, id)).orderBy(asc(revision.number)) }
}
