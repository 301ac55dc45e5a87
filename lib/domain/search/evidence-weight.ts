// How much what is proven counts in the order of search results. One formula, here and nowhere else.
import type { StampState } from '../stamps/stamp-state'
import { successBound } from '../evidence/order-posts'

export interface EvidenceFact {
  stampState: StampState
  /** A post on a critical system: how it went never ranks there. */
  critical: boolean
  /** Outcomes told of the current revision only. */
  asWritten: number
  withChange: number
  didNotWork: number
}

/** Modest on purpose: evidence decides between texts that fit about equally well, never against a text that fits better. */
const weightOfState: Record<StampState, number> = {
  'stamped': 1.15, 'one-of-two': 1.08, 'imported': 1.05, 'none': 1, 'lapsed': 0.97, 'plans-changed': 0.93, 'in-question': 0.85, 'withdrawn': 0,
}
const least = 0.85
const most = 1.25

/**
 * Factor on the text score: weight of the stamp state, plus off critical systems 0.1 × the Wilson lower bound of how it
 * went (−0.05 where the bound is 0: tried, and never worked), kept within 0.85 … 1.25. Withdrawn gives 0: never shown.
 */
export function evidenceWeight(fact: EvidenceFact): number {
  const ofState = weightOfState[fact.stampState]
  if (ofState === 0) return 0
  return Math.min(most, Math.max(least, ofState + ofOutcomes(fact)))
}

function ofOutcomes(fact: EvidenceFact): number {
  const bound = fact.critical ? null : successBound(fact)
  if (bound === null) return 0
  return bound === 0 ? -0.05 : 0.1 * bound
}
