// Writes a post, a revision with its projections, and the caches derived from them. Judgement comes from the caller.
import 'server-only'
import { eq } from 'drizzle-orm'
import type { Transaction } from '../client'
import { post, postHardware, postOperation, postSection, postTask, rendering, revision } from '../schema'

type NewRevision = typeof revision.$inferInsert
export interface Projections { sectionIds: number[]; taskIds: number[]; operationIds: number[]; hardware: string[] }

/** Inserts a post without its revision; returns its id. */
export async function insertPost(tx: Transaction, row: Omit<typeof post.$inferInsert, 'currentRevision' | 'updatedAt'>): Promise<number> {
  const [made] = await tx.insert(post).values({ ...row, currentRevision: 1, updatedAt: row.createdAt }).returning({ id: post.id })
  if (!made) throw new Error('The post was not inserted')
  return made.id
}

/** Adds a revision, makes it the current one, and replaces the projections (only an entry has any). */
export async function insertRevision(tx: Transaction, row: NewRevision, projections: Projections | null): Promise<void> {
  await tx.insert(revision).values(row)
  await tx.update(post).set({ currentRevision: row.number, updatedAt: row.createdAt }).where(eq(post.id, row.postId))
  if (!projections) return
  const postId = row.postId
  await tx.delete(postSection).where(eq(postSection.postId, postId))
  await tx.delete(postTask).where(eq(postTask.postId, postId))
  await tx.delete(postOperation).where(eq(postOperation.postId, postId))
  await tx.delete(postHardware).where(eq(postHardware.postId, postId))
  if (projections.sectionIds.length) await tx.insert(postSection).values(projections.sectionIds.map((sectionId, position) => ({ postId, sectionId, position })))
  if (projections.taskIds.length) await tx.insert(postTask).values(projections.taskIds.map((taskId) => ({ postId, taskId })))
  if (projections.operationIds.length) await tx.insert(postOperation).values(projections.operationIds.map((operationId) => ({ postId, operationId })))
  if (projections.hardware.length) await tx.insert(postHardware).values([...new Set(projections.hardware)].map((name) => ({ postId, name })))
}

/** Keeps rendered HTML; the newest renderer's wins. */
export async function saveRendering(tx: Transaction, row: typeof rendering.$inferInsert): Promise<void> {
  await tx.insert(rendering).values(row).onConflictDoUpdate({ target: rendering.key, set: { html: row.html, plain: row.plain, renderer: row.renderer } })
}

/** Sets the cached judgement of a post. */
export async function setJudgement(tx: Transaction, postId: number, cached: { stampState: typeof post.$inferInsert['stampState']; needsTwo: boolean }): Promise<void> {
  await tx.update(post).set(cached).where(eq(post.id, postId))
}
