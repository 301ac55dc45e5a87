// How good an order of documents is, by the judgments of people: the measures of a test collection. Pure; for one question at a time.
// Definitions as in trec_eval (NIST): a document that nobody judged has gain 0, and what was not found counts as missed.

/** Document to gain; 0 and absent are the same. */
export type Gains = ReadonlyMap<string, number>

export interface Scores {
  averagePrecision: number
  ndcg10: number
  precision5: number
  recall100: number
  reciprocalRank: number
  success1: number
  success3: number
}

/** Gains from which a document is relevant (precision, recall), and from which a question is answered (success, reciprocal rank). */
export interface Thresholds { relevant: number; success: number }

/** All measures of one question: `ranked` are the documents found, best first, each once. */
export function scoresOf(ranked: readonly string[], gains: Gains, { relevant, success }: Thresholds): Scores {
  const first = ranked.findIndex((id) => (gains.get(id) ?? 0) >= success) + 1
  return {
    averagePrecision: averagePrecision(ranked, gains, relevant), ndcg10: ndcg(ranked, gains, 10),
    precision5: precision(ranked, gains, relevant, 5), recall100: recall(ranked, gains, relevant, 100),
    reciprocalRank: first === 0 ? 0 : 1 / first, success1: Number(first === 1), success3: Number(first >= 1 && first <= 3),
  }
}

/** Sum of the precisions at each relevant document that was found, divided by how many there are to find. */
export function averagePrecision(ranked: readonly string[], gains: Gains, least: number): number {
  let [found, sum] = [0, 0]
  ranked.forEach((id, index) => {
    if ((gains.get(id) ?? 0) >= least) sum += ++found / (index + 1)
  })
  const all = relevantIn([...gains.keys()], gains, least)
  return all === 0 ? 0 : sum / all
}

/** Cumulated gain of the first `depth`, each divided by log2(rank + 1). The gain counts as judged, not as a power of two. */
export function dcg(gainsInOrder: readonly number[], depth: number): number {
  return gainsInOrder.slice(0, depth).reduce((sum, gain, index) => sum + gain / Math.log2(index + 2), 0)
}

/** The same, as a share of the best order of all judged documents. */
export function ndcg(ranked: readonly string[], gains: Gains, depth: number): number {
  const best = dcg([...gains.values()].sort((a, b) => b - a), depth)
  return best === 0 ? 0 : dcg(ranked.map((id) => gains.get(id) ?? 0), depth) / best
}

/** Share of relevant ones among the first `depth`; places left empty count as not relevant. */
export function precision(ranked: readonly string[], gains: Gains, least: number, depth: number): number {
  return relevantIn(ranked.slice(0, depth), gains, least) / depth
}

/** Share of all relevant documents that stand among the first `depth`. */
export function recall(ranked: readonly string[], gains: Gains, least: number, depth: number): number {
  const all = relevantIn([...gains.keys()], gains, least)
  return all === 0 ? 0 : relevantIn(ranked.slice(0, depth), gains, least) / all
}

/** Means over questions; all 0 when there is none. */
export function meanOf(scores: readonly Scores[]): Scores {
  const mean = (of: (one: Scores) => number) => (scores.length === 0 ? 0 : scores.reduce((sum, one) => sum + of(one), 0) / scores.length)
  return {
    averagePrecision: mean((s) => s.averagePrecision), ndcg10: mean((s) => s.ndcg10), precision5: mean((s) => s.precision5), recall100: mean((s) => s.recall100),
    reciprocalRank: mean((s) => s.reciprocalRank), success1: mean((s) => s.success1), success3: mean((s) => s.success3),
  }
}

const relevantIn = (ids: readonly string[], gains: Gains, least: number): number => ids.filter((id) => (gains.get(id) ?? 0) >= least).length
