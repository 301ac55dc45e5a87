// How much what is proven counts in the order of search results: score = text × evidence (here) × directness (directness.ts).
// The evidence formula stands here and nowhere else.
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

/** The evidence factor and what it is made of. */
export interface EvidenceParts {
  ofState: number
  /** What how it went adds; 0 on critical systems and where nobody has told. */
  ofOutcomes: number
  factor: number
}

/**
 * Factor on the text score: weight of the stamp state, plus off critical systems 0.1 × the Wilson lower bound of how it
 * went (−0.05 where the bound is 0: tried, and never worked), kept within 0.85 … 1.25. Withdrawn gives 0: never shown.
 */
export function evidenceWeight(fact: EvidenceFact): number {
  return weighEvidence(fact).factor
}

/** The same factor with its parts, for showing. */
export function weighEvidence(fact: EvidenceFact): EvidenceParts {
  const ofState = weightOfState[fact.stampState]
  const ofOutcomes = outcomesWeight(fact)
  return { ofState, ofOutcomes, factor: ofState === 0 ? 0 : Math.min(most, Math.max(least, ofState + ofOutcomes)) }
}

function outcomesWeight(fact: EvidenceFact): number {
  const bound = fact.critical ? null : successBound(fact)
  if (bound === null) return 0
  return bound === 0 ? -0.05 : 0.1 * bound
}
