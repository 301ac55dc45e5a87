// Names of hardware that posts use: completion while writing.
import 'server-only'
import { count, desc } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { postHardware } from '../schema'

/** The most used names first. */
export async function listHardwareNames(reader: ReaderOrTransaction, limit: number): Promise<string[]> {
  const rows = await reader.select({ name: postHardware.name, n: count() }).from(postHardware).groupBy(postHardware.name).orderBy(desc(count())).limit(limit)
  return rows.map((r) => r.name)
}
