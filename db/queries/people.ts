// Members and mentorships: who may act, and the steward's list.
import 'server-only'
import { and, asc, count, desc, eq, gt, isNull, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { attempt, member, mentorship, post, token } from '../schema'
import { isVisible } from './cautioned-post'

const live = and(eq(mentorship.memberId, member.id), isNull(mentorship.endedAt))

export type MemberRow = typeof member.$inferSelect

/** An active member with the mark of a live mentorship, or null. */
export async function getActiveMember(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ member, mark: mentorship.number }).from(member).leftJoin(mentorship, live)
    .where(and(eq(member.id, id), eq(member.state, 'active')))
  return row ?? null
}

export async function getMember(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ member, mark: mentorship.number }).from(member).leftJoin(mentorship, live).where(eq(member.id, id))
  return row ?? null
}

/** By e-mail in any case; null when nobody has it. */
export async function getMemberByEmail(reader: ReaderOrTransaction, email: string): Promise<MemberRow | null> {
  const [row] = await reader.select().from(member).where(eq(member.email, email.toLowerCase()))
  return row ?? null
}

/** The active member a token hash belongs to, or null. */
export async function getMemberByTokenHash(reader: ReaderOrTransaction, hash: string) {
  const [row] = await reader.select({ member, mark: mentorship.number }).from(token)
    .innerJoin(member, eq(member.id, token.memberId)).leftJoin(mentorship, live)
    .where(and(eq(token.hash, hash), isNull(token.revokedAt), eq(member.state, 'active')))
  return row ?? null
}

/** Everybody with an account, by name. */
export async function listMembers(reader: ReaderOrTransaction) {
  return reader.select({
    id: member.id, name: member.name, email: member.email, role: member.role, state: member.state, createdAt: member.createdAt,
    mentorshipId: mentorship.id, mark: mentorship.number, fields: mentorship.fields, mentorReason: mentorship.reason,
  }).from(member).leftJoin(mentorship, live).where(sql`${member.email} is not null`).orderBy(asc(member.name))
}

export async function listTokens(reader: ReaderOrTransaction, memberId: number) {
  return reader.select({ id: token.id, name: token.name, createdAt: token.createdAt, revokedAt: token.revokedAt })
    .from(token).where(eq(token.memberId, memberId)).orderBy(desc(token.id))
}

/** How often `key` tried since `since`. */
export async function countAttempts(reader: ReaderOrTransaction, key: string, since: number): Promise<number> {
  const [row] = await reader.select({ n: count() }).from(attempt).where(and(eq(attempt.key, key), gt(attempt.at, since)))
  return row?.n ?? 0
}

/** Mentorship history of a member, newest first. */
export async function listMentorships(reader: ReaderOrTransaction, memberId: number) {
  return reader.select().from(mentorship).where(eq(mentorship.memberId, memberId)).orderBy(desc(mentorship.id))
}

/** How many stewards can act. */
export async function countActiveStewards(reader: ReaderOrTransaction): Promise<number> {
  const [row] = await reader.select({ n: count() }).from(member).where(and(eq(member.role, 'steward'), eq(member.state, 'active')))
  return row?.n ?? 0
}

const entry = alias(post, 'entry')

/** Ids of a member's visible posts in visible entries, newest first. Text comes through cautioned-post.ts. */
export async function listRecentPosts(reader: ReaderOrTransaction, memberId: number, limit: number): Promise<{ id: number; entryId: number }[]> {
  return reader.select({ id: post.id, entryId: entry.id }).from(post)
    .innerJoin(entry, eq(entry.id, sql`coalesce(${post.parentId}, ${post.id})`))
    .where(and(eq(post.authorId, memberId), isVisible, eq(entry.state, 'visible')))
    .orderBy(desc(post.createdAt), desc(post.id)).limit(limit)
}
