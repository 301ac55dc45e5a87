// Replaces the measurements of a post's current text. Finding them is the caller's.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import type { Transaction } from '../client'
import { measurement, post, type MeasurementJson } from '../schema'

/**
 * Stores what parser `parser` found in the plain text of revision `number`. False, with nothing stored, when another revision is
 * the current one. No change that others see: `updatedAt` stays, and the change log hears nothing.
 */
export async function replaceMeasurements(tx: Transaction, { postId, number, parser }: { postId: number; number: number; parser: number }, found: readonly MeasurementJson[]): Promise<boolean> {
  const current = await tx.update(post).set({ measuredBy: parser }).where(and(eq(post.id, postId), eq(post.currentRevision, number))).returning({ id: post.id })
  if (current.length === 0) return false
  await tx.delete(measurement).where(eq(measurement.postId, postId))
  // In pieces, because a statement takes a limited number of values.
  for (let start = 0; start < found.length; start += 500) {
    await tx.insert(measurement).values(found.slice(start, start + 500)
      .map((one, i) => ({ postId, position: start + i, parser, kind: one.kind, siValue: one.si.value, found: one })))
  }
  return true
}
