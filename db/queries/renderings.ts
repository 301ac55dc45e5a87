// Kept HTML of remarks by key. A remark's HTML is only shown beside its post's cautions (lib/services/posts).
import 'server-only'
import { inArray } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { rendering } from '../schema'

export async function listRenderings(reader: ReaderOrTransaction, keys: readonly string[]) {
  return keys.length === 0 ? [] : reader.select().from(rendering).where(inArray(rendering.key, [...keys]))
}
