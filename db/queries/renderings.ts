// Kept HTML of remarks by key. A remark's HTML is only shown beside its post's cautions (lib/services/posts).
import 'server-only'
import type { ReaderOrTransaction } from '../client'
import { rendering } from '../schema'
import { oneOf } from './one-of'

export async function listRenderings(reader: ReaderOrTransaction, keys: readonly string[]) {
  return keys.length === 0 ? [] : reader.select().from(rendering).where(oneOf(rendering.key, keys))
}

/** Only the texts without marks. */
export async function listPlainTexts(reader: ReaderOrTransaction, keys: readonly string[]): Promise<{ key: string; plain: string }[]> {
  return keys.length === 0 ? [] : reader.select({ key: rendering.key, plain: rendering.plain }).from(rendering).where(oneOf(rendering.key, keys))
}
