// What a steward keeps of the plans: steps, hardware, closing items, bulletins; and which posts of a kit cite the plans at all.
import 'server-only'
import { and, asc, desc, eq, isNull, or, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { bulletin, bulletinStep, closingItem, hardwareItem, planStep, post, revision, task } from '../schema'

/** Plan steps of a section in their order, with the task done there. */
export async function listPlanSteps(reader: ReaderOrTransaction, sectionId: number) {
  return reader.select({ id: planStep.id, page: planStep.page, step: planStep.step, revision: planStep.revision, task: task.slug, taskTitle: task.title })
    .from(planStep).leftJoin(task, eq(task.id, planStep.taskId)).where(eq(planStep.sectionId, sectionId)).orderBy(asc(planStep.position), asc(planStep.id))
}

export async function listHardwareItems(reader: ReaderOrTransaction, sectionId: number) {
  return reader.select().from(hardwareItem).where(eq(hardwareItem.sectionId, sectionId)).orderBy(asc(hardwareItem.position), asc(hardwareItem.id))
}

/** Closing items that stand; ended ones stay in the table for the answers given to them. */
export async function listClosingItems(reader: ReaderOrTransaction, sectionId: number) {
  return reader.select().from(closingItem).where(and(eq(closingItem.sectionId, sectionId), isNull(closingItem.endedAt))).orderBy(asc(closingItem.position), asc(closingItem.id))
}

export interface BulletinRow {
  id: number; number: string; issuedOn: string; serials: string; summary: string; createdAt: number
  steps: { page: string; step: string | null; revision: string }[]
}

/** Bulletins of a kit, the newest first, each with its pages and steps. */
export async function listBulletins(reader: ReaderOrTransaction, kitId: number): Promise<BulletinRow[]> {
  const rows = await reader.select({ bulletin, place: bulletinStep }).from(bulletin).innerJoin(bulletinStep, eq(bulletinStep.bulletinId, bulletin.id))
    .where(eq(bulletin.kitId, kitId)).orderBy(desc(bulletin.issuedOn), desc(bulletin.id), asc(bulletinStep.position))
  const found = new Map<number, BulletinRow>()
  for (const row of rows) {
    const known = found.get(row.bulletin.id) ?? { ...row.bulletin, steps: [] }
    known.steps.push({ page: row.place.page, step: row.place.step, revision: row.place.revision })
    found.set(row.bulletin.id, known)
  }
  return [...found.values()]
}

/** Ids of a kit's posts, in any state, that may cite one of these pages (in small letters, without spaces): in the entry's references, or in a plans stamp that was not withdrawn. Who judges looks closer. */
export async function listPostsCitingPages(reader: ReaderOrTransaction, kitId: number, pages: readonly string[]): Promise<number[]> {
  const entry = alias(post, 'entry')
  const holdsPage = (text: SQL) => or(...pages.map((page) => sql`instr(replace(lower(${text}), ' ', ''), ${page}) > 0`))
  const hasPlansStamp = sql`exists (select 1 from stamp s where s.post_id = ${post.id} and s.basis = 'plans' and s.withdrawn_at is null and (${holdsPage(sql`s.reference`)}))`
  const rows = await reader.select({ id: post.id }).from(post).innerJoin(entry, eq(entry.id, sql`coalesce(${post.parentId}, ${post.id})`))
    .innerJoin(revision, and(eq(revision.postId, entry.id), eq(revision.number, entry.currentRevision)))
    .where(and(eq(revision.kitId, kitId), or(holdsPage(sql`${revision.plans}`), hasPlansStamp))).orderBy(asc(post.id))
  return rows.map((r) => r.id)
}
