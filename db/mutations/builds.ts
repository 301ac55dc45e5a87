// Writes on a member's own build. Called inside write(); whether the actor may is asked by the service.
import 'server-only'
import { and, eq, inArray, isNull } from 'drizzle-orm'
import type { Transaction } from '../client'
import { build, buildSection, closingAnswer, debrief, finding, hold, visit, workSession } from '../schema'

type Inserted<T extends { $inferInsert: object }> = T['$inferInsert']

export async function insertBuild(tx: Transaction, row: Inserted<typeof build>): Promise<number> {
  const [made] = await tx.insert(build).values(row).returning({ id: build.id })
  if (!made) throw new Error('The build was not inserted')
  return made.id
}

export async function saveSectionState(tx: Transaction, row: Inserted<typeof buildSection>): Promise<void> {
  await tx.insert(buildSection).values(row).onConflictDoUpdate({ target: [buildSection.buildId, buildSection.sectionId], set: { state: row.state, updatedAt: row.updatedAt } })
}

export async function insertLogLine(tx: Transaction, row: Inserted<typeof workSession>): Promise<number> {
  const [made] = await tx.insert(workSession).values(row).returning({ id: workSession.id })
  if (!made) throw new Error('The line was not inserted')
  return made.id
}

export async function updateLogLine(tx: Transaction, id: number, set: Pick<Inserted<typeof workSession>, 'day' | 'minutes' | 'page' | 'steps' | 'helpers' | 'line'>): Promise<void> {
  await tx.update(workSession).set(set).where(eq(workSession.id, id))
}

export async function insertHold(tx: Transaction, row: Inserted<typeof hold>): Promise<number> {
  const [made] = await tx.insert(hold).values(row).returning({ id: hold.id })
  if (!made) throw new Error('The hold was not inserted')
  return made.id
}

export async function releaseHoldRow(tx: Transaction, id: number, releasedAt: number, releaseNote: string): Promise<void> {
  await tx.update(hold).set({ releasedAt, releaseNote }).where(and(eq(hold.id, id), isNull(hold.releasedAt)))
}

export async function saveClosingAnswer(tx: Transaction, row: Inserted<typeof closingAnswer>): Promise<void> {
  const { isDone, note, at } = row
  await tx.insert(closingAnswer).values(row).onConflictDoUpdate({ target: [closingAnswer.buildId, closingAnswer.closingItemId], set: { isDone, note, at } })
}

/** A member who leaves takes along what was private: names, serials and words go, links end; hours stay, since they are part of what is known of a section. */
export async function clearBuilds(tx: Transaction, memberId: number, at: number): Promise<void> {
  const own = (await tx.select({ id: build.id }).from(build).where(eq(build.memberId, memberId))).map((b) => b.id)
  if (own.length === 0) return
  await tx.update(build).set({ name: '', serial: '', endedAt: at }).where(inArray(build.id, own))
  await tx.update(workSession).set({ helpers: '', line: '', page: '', steps: '' }).where(inArray(workSession.buildId, own))
  await tx.update(hold).set({ what: '', page: '', step: '', until: '', notWaiting: '', releaseNote: '' }).where(inArray(hold.buildId, own))
  await tx.update(debrief).set({ tools: '' }).where(inArray(debrief.buildId, own))
  await tx.update(finding).set({ text: '' }).where(inArray(finding.visitId, tx.select({ id: visit.id }).from(visit).where(inArray(visit.buildId, own))))
  await tx.update(closingAnswer).set({ note: '' }).where(inArray(closingAnswer.buildId, own))
  await tx.update(visit).set({ visitor: '', revokedAt: at }).where(inArray(visit.buildId, own))
}
