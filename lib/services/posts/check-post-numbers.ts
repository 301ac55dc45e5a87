// The numbers check of a post: its text against the shop tables, read with the hardware of its entry.
import 'server-only'
import type { CautionedPost } from '@/db/queries/cautioned-post'
import { wholeText } from '@/lib/domain/entries/entry-text'
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import type { NumbersCheck } from '@/lib/domain/numbers-check/numbers-check'

/** Every check of the post's current text; an answer takes its question's hardware and tasks. `limits`: those of the entry's kit. */
export function checkPostNumbers(found: CautionedPost, question: CautionedPost | null, limits: readonly MakerLimit[]): NumbersCheck[] {
  const { tasks, hardware } = (question ?? found).current
  return checkNumbers(found.plain ?? wholeText(found.kind, found.current.parts, found.current.body), { tasks, hardware, limits })
}
