// Picks a post out of the entry it belongs to. Part of the API handlers only.
import { refuse } from '@/lib/errors'
import type { Answer, Entry } from '@/lib/schemas/post'

/** The entry itself or one of its answers; 404 when it was hidden from the actor meanwhile. */
export function postOf(entry: Entry, postId: number): Entry | Answer {
  const found = entry.id === postId ? entry : entry.answers.find((a) => a.id === postId)
  if (!found) throw refuse.notFound('This post')
  return found
}
