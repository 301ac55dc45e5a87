// What a section's order is made of: plan steps, order advice and debriefs; and which posts a brief is about. Slugs, numbers and ids only: text comes through cautioned-post.ts.
import 'server-only'
import { and, asc, desc, eq, isNull, ne, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { build, closingItem, debrief, kit, planStep, post, postSection, revision, section, task } from '../schema'
import { oneOf } from './one-of'

/** Visible, said so that the section's few posts are found first: by its index on state SQLite would walk through every post there is. */
const isVisibleHere = sql`+${post.state} = 'visible'`

/** Plan steps that name a task, in their order. */
export async function listTaskSteps(reader: ReaderOrTransaction, sectionId: number) {
  return reader.select({ page: planStep.page, step: planStep.step, revision: planStep.revision, task: task.slug, title: task.title }).from(planStep)
    .innerJoin(task, eq(task.id, planStep.taskId)).where(eq(planStep.sectionId, sectionId)).orderBy(asc(planStep.position), asc(planStep.id))
}

/** Sections of other kits on the same JASC system. */
export async function listSameSystem(reader: ReaderOrTransaction, { jasc, kitId }: { jasc: string | null; kitId: number }) {
  if (jasc === null) return []
  return reader.select({ id: section.id, code: section.code, title: section.title, kit: kit.name }).from(section).innerJoin(kit, eq(kit.id, section.kitId))
    .where(and(eq(section.jasc, jasc), ne(section.kitId, kitId))).orderBy(asc(kit.id), asc(section.position))
}

/** Visible lessons of these sections with what they say of order and hours, by section; a lesson of two sections comes twice. */
export async function listLessonAdvice(reader: ReaderOrTransaction, sectionIds: readonly number[]) {
  return reader.select({
    sectionId: postSection.sectionId, postId: post.id, authorId: post.authorId, authorName: post.authorName, at: revision.createdAt, orderAdvice: revision.orderAdvice,
    hours: sql<number | string | null>`json_extract(${revision.parts}, '$.hours')`,
  }).from(postSection).innerJoin(post, eq(post.id, postSection.postId)).innerJoin(revision, and(eq(revision.postId, post.id), eq(revision.number, post.currentRevision)))
    .where(and(oneOf(postSection.sectionId, sectionIds), isVisibleHere, eq(post.kind, 'lesson'))).orderBy(asc(post.id))
}

/** Debriefs of these sections that were not taken back, newest first. Who told is named by number only. */
export async function listDebriefOrders(reader: ReaderOrTransaction, sectionIds: readonly number[]) {
  return reader.select({ sectionId: debrief.sectionId, memberId: build.memberId, at: debrief.createdAt, taskOrder: debrief.taskOrder, minutes: debrief.minutes }).from(debrief)
    .innerJoin(build, eq(build.id, debrief.buildId)).where(and(oneOf(debrief.sectionId, sectionIds), isNull(debrief.undoneAt))).orderBy(desc(debrief.createdAt), desc(debrief.id))
}

const question = alias(post, 'question')

/** Every visible entry of a section and every visible answer under one, newest first; `answers` counts an entry's. Two statements, since one with an "or" would walk through all posts. */
export async function listBriefPosts(reader: ReaderOrTransaction, sectionId: number) {
  const shown = { id: post.id, parentId: post.parentId, kind: post.kind, stampState: post.stampState, createdAt: post.createdAt }
  const entries = await reader.select(shown).from(postSection).innerJoin(post, eq(post.id, postSection.postId)).where(and(eq(postSection.sectionId, sectionId), isVisibleHere))
  const answers = await reader.select(shown).from(postSection).innerJoin(question, eq(question.id, postSection.postId)).innerJoin(post, eq(post.parentId, question.id))
    .where(and(eq(postSection.sectionId, sectionId), isVisibleHere, sql`+${question.state} = 'visible'`))
  const counts = new Map<number | null, number>()
  for (const { parentId } of answers) counts.set(parentId, (counts.get(parentId) ?? 0) + 1)
  return [...entries, ...answers].map((row) => ({ ...row, answers: counts.get(row.id) ?? 0 })).sort((a, b) => b.createdAt - a.createdAt || b.id - a.id)
}

export async function listClosingLines(reader: ReaderOrTransaction, sectionId: number) {
  return reader.select({ text: closingItem.text, origin: closingItem.origin, reference: closingItem.reference }).from(closingItem)
    .where(and(eq(closingItem.sectionId, sectionId), isNull(closingItem.endedAt))).orderBy(asc(closingItem.position), asc(closingItem.id))
}
