// Visit sheets and their findings. Found by the hash of the token alone, or by their build for its owner.
import 'server-only'
import { and, asc, desc, eq, max } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { build, finding, kit, section, visit } from '../schema'
import { oneOf } from './one-of'

/** The visit with its build, kit and section, whatever its state, or null. */
export async function getVisitByHash(reader: ReaderOrTransaction, tokenHash: string) {
  const [row] = await reader.select({ visit, build, kit, section }).from(visit).innerJoin(build, eq(build.id, visit.buildId)).innerJoin(kit, eq(kit.id, build.kitId))
    .innerJoin(section, eq(section.id, visit.sectionId)).where(eq(visit.tokenHash, tokenHash))
  return row ?? null
}

/** Visits of one section of a build, newest first. */
export async function listVisits(reader: ReaderOrTransaction, buildId: number, sectionId: number) {
  return reader.select().from(visit).where(and(eq(visit.buildId, buildId), eq(visit.sectionId, sectionId))).orderBy(desc(visit.id))
}

export async function listFindings(reader: ReaderOrTransaction, visitIds: readonly number[]) {
  return reader.select().from(finding).where(oneOf(finding.visitId, visitIds)).orderBy(asc(finding.number))
}

/** The number of the next line. */
export async function nextFindingNumber(reader: ReaderOrTransaction, visitId: number): Promise<number> {
  const [row] = await reader.select({ last: max(finding.number) }).from(finding).where(eq(finding.visitId, visitId))
  return (row?.last ?? 0) + 1
}

export async function getVisit(reader: ReaderOrTransaction, buildId: number, id: number) {
  const [row] = await reader.select().from(visit).where(and(eq(visit.buildId, buildId), eq(visit.id, id)))
  return row ?? null
}
