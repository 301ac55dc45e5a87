// Writes of visit sheets and their findings. Called inside write().
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import type { Transaction } from '../client'
import { finding, visit } from '../schema'

export async function insertVisit(tx: Transaction, row: typeof visit.$inferInsert): Promise<number> {
  const [made] = await tx.insert(visit).values(row).returning({ id: visit.id })
  if (!made) throw new Error('The visit was not inserted')
  return made.id
}

export async function endVisit(tx: Transaction, id: number, revokedAt: number): Promise<void> {
  await tx.update(visit).set({ revokedAt }).where(and(eq(visit.id, id), isNull(visit.revokedAt)))
}

export async function insertFinding(tx: Transaction, row: typeof finding.$inferInsert): Promise<number> {
  const [made] = await tx.insert(finding).values(row).returning({ id: finding.id })
  if (!made) throw new Error('The finding was not inserted')
  return made.id
}
