// Weighs one claimed value against everything the sources and the kit maker allow. Agrees if one allows it, conflicts only if none does.
import { findMeasurements } from '../measurements/find-measurements'
import type { Citation } from '../shop/citation'
import type { MakerLimit } from '../shop/maker-limits'
import type { Mark } from './marks'
import type { NumbersCheck, Verdict } from './numbers-check'

/** What a kind found out. The span runs from the first to the last of its marks. */
export interface Finding extends Pick<NumbersCheck, 'verdict' | 'expected' | 'table' | 'source' | 'basis'> {
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
}

const allows = ({ low, high }: Claim, allowed: Pick<Allowed, 'low' | 'high'>, slack: number): boolean => low >= allowed.low - slack && high <= allowed.high + slack

/**
 * `doubtful`: the sources leave it open whether this value, which none of them names, is wrong. Without any source nothing can be told.
 */
export function judge(claim: Claim, sources: readonly Allowed[], limits: readonly MakerLimit[], doubtful = false): Finding {
  const makers = limits.flatMap((limit) => makerAllows(limit, claim))
  const all = [...makers, ...sources]
  const slack = claim.slack + 1e-9
  const fitting = all.find((allowed) => allows(claim, allowed, slack))
  const verdict: Verdict = fitting ? 'agrees' : all.length === 0 || (doubtful && makers.length === 0) ? 'cannot-tell' : 'conflicts'
  const named = fitting ?? all[0]
  return {
    marks: claim.marks, verdict, table: claim.table,
    ...(named ? { expected: fitting ? named.expected : [...new Set(all.map(({ expected }) => expected))].join('; '), source: named.citation.source, basis: named.citation.basis } : {}),
  }
}

/** A verdict that is no matter of a range. */
export function finding(marks: readonly Mark[], verdict: Verdict, table: string, expected?: string, citation?: Citation): Finding {
  return { marks, verdict, table, ...(expected ? { expected } : {}), ...(citation ? { source: citation.source, basis: citation.basis } : {}) }
}

function makerAllows(limit: MakerLimit, claim: Claim): Allowed[] {
  if (limit.table !== claim.table || limit.result !== claim.result) return []
  const { number, min = number, max = number } = limit.value
  if ((min === undefined && max === undefined) || !fitsSize(limit, claim.size)) return []
  return [{ low: min ?? -Infinity, high: max ?? Infinity, expected: `${limit.display.inch}, the kit maker's limit`, citation: { source: limit.reference, basis: 'maker', notes: [] } }]
}

/** A limit that names a fastener is for that one. */
function fitsSize({ note = '', reference }: MakerLimit, size: number | undefined): boolean {
  const named = findMeasurements(`${note} ${reference.section}`).flatMap(({ diameter }) => (diameter === undefined ? [] : [diameter]))
  return named.length === 0 || (size !== undefined && named.some((diameter) => Math.abs(diameter - size) < 1e-6))
}
