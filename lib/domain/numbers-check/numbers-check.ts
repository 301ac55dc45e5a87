// What the numbers check says about one statement of a text. Finding statements is check-numbers.ts, judging them the kinds/ beside it.
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import type { Basis, Source } from '@/lib/domain/shop/shop-table'

export type Verdict = 'agrees' | 'conflicts' | 'cannot-tell'
/** advised: the author's own advice; measured: a reading, compared and charged to nobody. */
export type ClaimRole = 'advised' | 'measured'

/** One checked statement. Offsets are UTF-16 code units, end exclusive: text.slice(start, end) is `claim`. */
export interface NumbersCheck {
  claim: string
  start: number
  end: number
  role: ClaimRole
  verdict: Verdict
  /** What the table gives, in words with units; several sources are set apart by a semicolon. */
  expected?: string
  /** Slug of the shop table. */
  table?: string
  source?: Source | null
  basis?: Basis
  /** The kit maker's own limit where it does not allow what a handbook does; it wins. */
  makerLimit?: string
}

/** What is known beside the text. Lengths of maker's limits are in inches, torques in inch-pounds (lbf-in). */
export interface CheckContext {
  tasks?: readonly string[]
  /** Names the entry's hardware, such as "AN470AD4": a bare "use #30" is then about it, if it is the only one of its kind. */
  hardware?: readonly string[]
  limits?: readonly MakerLimit[]
}
