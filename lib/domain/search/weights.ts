// The numbers that rank: one configuration for everything that is searched. `npm run fit:search` chooses among them on judged questions;
// what each does stands where it is used.

export interface SearchWeights {
  /** How often a title counts, as repetitions in the one field that is indexed. */
  titleRepeats: number
  /** Of BM25 as MiniSearch has it: saturation, weight of length, lower bound. */
  bm25: { k: number; b: number; d: number }
  /** Factors of the routes in understand-query.ts; `corrected` is by rank of the meant word. */
  factor: {
    synonym: number; also: number; joined: number; splitUnknown: number; splitKnown: number; corrected: readonly number[]; completed: number
    unit: number; unknownNumber: number
  }
  /** least-coverage.ts: what a short question must be covered by, what each further concept takes off, and the floor. */
  coverage: { short: number; perConcept: number; least: number }
  /** Of questions with at least `concepts`: how many `terms` of the first `entries` found are added, the first of them with `weight`. */
  feedback: { concepts: number; entries: number; terms: number; weight: number }
}

export const searchWeights: SearchWeights = {
  titleRepeats: 3,
  bm25: { k: 1.8, b: 0.7, d: 0 },
  factor: {
    synonym: 0.5, also: 0.25, joined: 0.5, splitUnknown: 0.9, splitKnown: 0.2, corrected: [0.9, 0.6, 0.5], completed: 0.8,
    unit: 0.3, unknownNumber: 0.4,
  },
  coverage: { short: 0.5, perConcept: 0.04, least: 0.33 },
  feedback: { concepts: 3, entries: 6, terms: 25, weight: 0.3 },
}
