// The passage of a post that a brief shows: of a lesson what its builder would do differently, of anything else its beginning. Pure.
import type { PartsValue } from '../entries/entry-text'
import { makeSnippet } from '../search/snippet'

const longestPassage = 240

/** @param plain the rendered text of the whole post, its parts after one another; that it is plain is why it is not cut from Markdown */
export function passageOf(plain: string, parts: PartsValue): string {
  const start = startOf(plain, parts?.['differently'], 0) ?? 0
  const end = startOf(plain, parts?.['tools'], start) ?? plain.length
  return makeSnippet(plain.slice(start, end > start ? end : plain.length), [], longestPassage).snippet
}

/** Where the first words of a part stand in the plain text; null when they don't. */
function startOf(plain: string, part: string | number | undefined, from: number): number | null {
  if (typeof part !== 'string') return null
  const words = (part.match(/[\p{L}\p{N}]+/gu) ?? []).slice(0, 5)
  if (words.length === 0) return null
  const found = new RegExp(words.join('[^\\p{L}\\p{N}]+'), 'u').exec(plain.slice(from))
  return found ? from + found.index : null
}
