// Aeroplanes of members with what is kept of them. Who may see them is asked by the services; texts of posts come through cautioned-post.ts.
import 'server-only'
import { and, asc, desc, eq, isNull, or, sql, sum } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { build, buildSection, closingAnswer, closingItem, hold, kit, post, postSection, reliance, section, workSession } from '../schema'
import { oneOf } from './one-of'

/** A build that has not ended, with its kit, or null. */
export async function getBuild(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ build, kit }).from(build).innerJoin(kit, eq(kit.id, build.kitId)).where(and(eq(build.id, id), isNull(build.endedAt)))
  return row ?? null
}

/** A member's builds that have not ended, oldest first. */
export async function listBuilds(reader: ReaderOrTransaction, memberId: number) {
  return reader.select({ build, kit }).from(build).innerJoin(kit, eq(kit.id, build.kitId)).where(and(eq(build.memberId, memberId), isNull(build.endedAt))).orderBy(asc(build.id))
}

/** The newest build of this kit that the member has, or null. */
export async function getOwnBuildOfKit(reader: ReaderOrTransaction, memberId: number, kitId: number): Promise<number | null> {
  const [row] = await reader.select({ id: build.id }).from(build).where(and(eq(build.memberId, memberId), eq(build.kitId, kitId), isNull(build.endedAt))).orderBy(desc(build.id)).limit(1)
  return row?.id ?? null
}

/** Sections of these builds' kits in plan order, each with its state on the build. */
export async function listBuildSections(reader: ReaderOrTransaction, buildIds: readonly number[]) {
  return reader.select({ buildId: build.id, section, state: buildSection.state }).from(build).innerJoin(section, eq(section.kitId, build.kitId))
    .leftJoin(buildSection, and(eq(buildSection.buildId, build.id), eq(buildSection.sectionId, section.id))).where(oneOf(build.id, buildIds)).orderBy(asc(build.id), asc(section.position))
}

/** Minutes logged, by build and section. */
export async function listMinutes(reader: ReaderOrTransaction, buildIds: readonly number[]) {
  return reader.select({ buildId: workSession.buildId, sectionId: workSession.sectionId, minutes: sum(workSession.minutes).mapWith(Number) }).from(workSession)
    .where(oneOf(workSession.buildId, buildIds)).groupBy(workSession.buildId, workSession.sectionId)
}

/** The log of one section, newest day first. */
export async function listLog(reader: ReaderOrTransaction, buildId: number, sectionId: number) {
  return reader.select().from(workSession).where(and(eq(workSession.buildId, buildId), eq(workSession.sectionId, sectionId))).orderBy(desc(workSession.day), desc(workSession.id))
}

export async function getLogLine(reader: ReaderOrTransaction, buildId: number, find: { id: number } | { key: string }) {
  const [row] = await reader.select().from(workSession).where(and(eq(workSession.buildId, buildId), 'id' in find ? eq(workSession.id, find.id) : eq(workSession.key, find.key)))
  return row ?? null
}

const until = alias(section, 'until_section')
const earlier = alias(hold, 'earlier')
/** Counted within the build, so that its number says nothing of other builds. */
const ordinal = sql<number>`(select count(*) from ${hold} as ${sql.identifier('earlier')} where ${earlier.buildId} = ${hold.buildId} and ${earlier.id} <= ${hold.id})`

function selectHolds(reader: ReaderOrTransaction) {
  return reader.select({ hold, ordinal: ordinal.mapWith(Number), section, until: until.code }).from(hold).innerJoin(section, eq(section.id, hold.sectionId)).leftJoin(until, eq(until.id, hold.untilSectionId)).$dynamic()
}
export type HoldRow = Awaited<ReturnType<typeof selectHolds>>[number]

/** All holds of these builds, released ones too, oldest first. */
export async function listHolds(reader: ReaderOrTransaction, buildIds: readonly number[]): Promise<HoldRow[]> {
  return selectHolds(reader).where(oneOf(hold.buildId, buildIds)).orderBy(asc(hold.id))
}

/** One hold by what is known of it, or null. */
export async function getHold(reader: ReaderOrTransaction, find: { code: string } | { buildId: number; id: number } | { buildId: number; key: string }): Promise<HoldRow | null> {
  const where = 'code' in find ? eq(hold.code, find.code) : and(eq(hold.buildId, find.buildId), 'id' in find ? eq(hold.id, find.id) : eq(hold.key, find.key))
  return (await selectHolds(reader).where(where))[0] ?? null
}

/** The closing list of a section with this build's answers; an ended line stays where it was answered. */
export async function listClosing(reader: ReaderOrTransaction, buildId: number, sectionId: number) {
  return reader.select({ item: closingItem, answer: closingAnswer }).from(closingItem)
    .leftJoin(closingAnswer, and(eq(closingAnswer.closingItemId, closingItem.id), eq(closingAnswer.buildId, buildId)))
    .where(and(eq(closingItem.sectionId, sectionId), or(isNull(closingItem.endedAt), sql`${closingAnswer.buildId} is not null`))).orderBy(asc(closingItem.position), asc(closingItem.id))
}

const entry = sql<number>`coalesce(${post.parentId}, ${post.id})`

/** What a member goes by on a kit, or on one section of it: an answer counts for its question's sections. */
export async function listGoneBy(reader: ReaderOrTransaction, memberId: number, place: { kitId: number } | { sectionId: number }) {
  return reader.selectDistinct({ postId: reliance.postId, parentId: post.parentId, revision: reliance.revision, createdAt: reliance.createdAt }).from(reliance).innerJoin(post, eq(post.id, reliance.postId))
    .innerJoin(postSection, eq(postSection.postId, entry)).innerJoin(section, eq(section.id, postSection.sectionId))
    .where(and(eq(reliance.memberId, memberId), 'kitId' in place ? eq(section.kitId, place.kitId) : eq(section.id, place.sectionId))).orderBy(desc(reliance.createdAt), desc(reliance.postId))
}

/** A line of a closing list that still stands, with its section, or null. */
export async function getClosingItem(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ item: closingItem, section }).from(closingItem).innerJoin(section, eq(section.id, closingItem.sectionId)).where(and(eq(closingItem.id, id), isNull(closingItem.endedAt)))
  return row ?? null
}
