// The order in which posts stand under one another: what is proven first. On critical systems how it went never ranks.
import type { StampState } from '../stamps/stamp-state'
import { wilsonLowerBound } from './wilson'

export interface OrderedFact {
  stampState: StampState
  /** A post on a critical system. */
  critical: boolean
  /** Outcomes told of the current revision only. */
  asWritten: number
  withChange: number
  didNotWork: number
  createdAt: number
  id: number
}

/** On critical systems a first stamp is worth something, and a stamp in question goes last. */
const criticalRank: Record<StampState, number> = {
  'stamped': 0, 'one-of-two': 1, 'imported': 2, 'none': 3, 'lapsed': 3, 'plans-changed': 3, 'in-question': 4, 'withdrawn': 4,
}

/** Wilson lower bound of "as written" or "with a change" among all reports; null while nobody has tried. */
export function successBound(fact: Pick<OrderedFact, 'asWritten' | 'withChange' | 'didNotWork'>): number | null {
  const trials = fact.asWritten + fact.withChange + fact.didNotWork
  return trials === 0 ? null : wilsonLowerBound(fact.asWritten + fact.withChange, trials)
}

/**
 * The facts in the order they are shown. Stamped first; off critical systems by bound (untried before a bound of 0),
 * then fewer failures; then older first. One critical post makes the whole list critical, so that the order stays total.
 */
export function orderPosts<F extends OrderedFact>(facts: readonly F[]): F[] {
  const critical = facts.some((f) => f.critical)
  return [...facts].sort(critical ? compareCritical : compareOffCritical)
}

function compareCritical(a: OrderedFact, b: OrderedFact): number {
  return criticalRank[a.stampState] - criticalRank[b.stampState] || olderFirst(a, b)
}

function compareOffCritical(a: OrderedFact, b: OrderedFact): number {
  return Number(b.stampState === 'stamped') - Number(a.stampState === 'stamped')
    || boundRank(b) - boundRank(a) || a.didNotWork - b.didNotWork || olderFirst(a, b)
}

const olderFirst = (a: OrderedFact, b: OrderedFact) => a.createdAt - b.createdAt || a.id - b.id

/** Untried stands just above a bound of zero and below any other bound. */
function boundRank(fact: OrderedFact): number {
  return successBound(fact) ?? Number.MIN_VALUE
}
