// Weighs one claimed value against everything the sources and the kit maker allow. Agrees if one allows it, conflicts only if none does.
import type { Citation } from '../shop/citation'
import type { MakerLimit } from '../shop/maker-limits'
import { makerAllowed, makerStanding } from './maker-standing'
import type { Mark } from './marks'
import type { NumbersCheck, Verdict } from './numbers-check'

/** What a kind found out. The span runs from the first to the last of its marks. */
export interface Finding extends Pick<NumbersCheck, 'verdict' | 'expected' | 'table' | 'source' | 'basis' | 'makerLimit'> {
  marks: readonly Mark[]
}

/** Values one source allows, ends included. */
export interface Allowed {
  low: number
  high: number
  expected: string
  citation: Citation
}

export interface Claim {
  marks: readonly Mark[]
  low: number
  high: number
  /** What an end may be off by and still be the same number. */
  slack: number
  table: string
  result: string
  /** Inches of the fastener or thing spoken of, to match a maker's limit that names one. */
  size?: number
  /** Other inputs of the table that the text names, by input name: `{ nut: 'tension' }`. */
  said?: Readonly<Record<string, string>>
}

const allows = ({ low, high }: Claim, allowed: Pick<Allowed, 'low' | 'high'>, slack: number): boolean => low >= allowed.low - slack && high <= allowed.high + slack

/**
 * `doubtful`: the sources leave it open whether this value, which none of them names, is wrong. Without any source nothing can be told.
 */
export function judge(claim: Claim, sources: readonly Allowed[], limits: readonly MakerLimit[], doubtful = false): Finding {
  const makersOf = (standing: 'holds' | 'may-hold') => limits.flatMap((limit) => (makerStanding(limit, claim) === standing ? (makerAllowed(limit, claim) ?? []) : []))
  const [makers, possible] = [makersOf('holds'), makersOf('may-hold')]
  const all = [...makers, ...sources]
  const slack = claim.slack + 1e-9
  const fitting = all.find((allowed) => allows(claim, allowed, slack))
  // A limit for a nut the text doesn't name may be the one that was meant.
  const excuse = fitting ? undefined : possible.find((allowed) => allows(claim, allowed, slack))
  const isOpen = all.length === 0 || excuse !== undefined || (doubtful && makers.length === 0)
  const verdict: Verdict = fitting ? 'agrees' : isOpen ? 'cannot-tell' : 'conflicts'
  const named = fitting ?? excuse ?? all[0]
  const expected = fitting ?? excuse
  // A handbook allows it, and the kit maker's own limit does not: no conflict, but nobody should read it as the maker's word.
  const overruled = fitting && makers.length > 0 && !makers.some((allowed) => allows(claim, allowed, slack))
  return {
    marks: claim.marks, verdict, table: claim.table,
    ...(named ? { expected: expected ? expected.expected : [...new Set(all.map(({ expected }) => expected))].join('; '), source: named.citation.source, basis: named.citation.basis } : {}),
    ...(overruled ? { makerLimit: [...new Set(makers.map((m) => `${m.expected} (${m.citation.source?.title ?? 'the kit maker'})`))].join('; ') } : {}),
  }
}

/** A verdict that is no matter of a range. */
export function finding(marks: readonly Mark[], verdict: Verdict, table: string, expected?: string, citation?: Citation): Finding {
  return { marks, verdict, table, ...(expected ? { expected } : {}), ...(citation ? { source: citation.source, basis: citation.basis } : {}) }
}
