// The order of what holds a question's words: how much of it is held, BM25, evidence, directness, and for long questions what the first hits share.
import 'server-only'
import type { AskedDirectly } from './asked-directly'
import { HeldTerms } from './held-terms'
import type { SearchFilters } from './messages'
import type { PackedDocument } from './packed-document'
import type { Postings } from './postings'
import type { Question } from './question'

/** Entries far below the best one only share a common word with the question. */
const leastShareOfBest = 0.25
/** Of more entries than this only those that hold most of the question are scored, of equals those with the best evidence; the rest follow by what they hold. */
export const mostScored = 1_000

/** The postings know an entry by its slot, a small number used again after the entry is gone: bits are kept by it. */
export interface Kept { slot: number; document: PackedDocument; weight: number }
/** `shared`: the part of the score that comes from what the first hits share. */
export interface Scored { kept: Kept; coverage: number; score: number; shared: number }
export interface Wanted { filters: SearchFilters; least: number; mostScored: number; wanted: number }
export interface Asked { question: Question; direct: AskedDirectly }
/** `considered` hold a word of the question; those that hold less than `cutBelow` of it are not among `found`. */
export interface Ranked { found: Scored[]; held: HeldTerms; best: number; cutBelow: number; considered: number }

export class Ranking {
  /** `slots`: the entries by slot, kept up to date by the index. */
  constructor(private readonly postings: Postings, private readonly slots: readonly (Kept | undefined)[]) {}

  /** All that is found, the first `wanted` in order: best first, newest of equals first. Empty when even the best holds less than `least` of the question. */
  rank(asked: Asked, { filters, least, mostScored: most, wanted }: Wanted): Ranked {
    const { question } = asked
    const held = this.postings.findHeld(question, this.slots.length)
    const coverageAt = this.coverages(question, held)
    const near: Scored[] = []
    let [best, considered] = [0, 0]
    for (const slot of held.slots) {
      const kept = this.slots[slot]
      if (!kept || kept.weight === 0 || !passes(kept.document, filters)) continue
      considered++
      const coverage = coverageAt(slot)
      if (coverage > best) best = coverage
      if (coverage >= best * leastShareOfBest) near.push({ kept, coverage, score: 0, shared: 0 })
    }
    const cutBelow = best * leastShareOfBest
    const found = best === 0 || best < least ? [] : this.order(near.filter(({ coverage }) => coverage >= cutBelow), asked, held, { most, wanted })
    return { found, held, best, cutBelow, considered }
  }

  /** Thousands of entries hold the same few terms of a question: each set of terms is weighed once. */
  private coverages(question: Question, held: HeldTerms): (slot: number) => number {
    const known = new Map<number, number>()
    return (slot) => {
      const pattern = held.pattern(slot)
      if (pattern === null) return question.coverage(held.at(slot))
      const seen = known.get(pattern)
      if (seen !== undefined) return seen
      const coverage = question.coverage(held.at(slot))
      known.set(pattern, coverage)
      return coverage
    }
  }

  /** The formula: score = BM25 (of the held terms, each by its routes) × evidence of the entry × directness. */
  private order(found: readonly Scored[], asked: Asked, held: HeldTerms, { most, wanted }: { most: number; wanted: number }): Scored[] {
    const { question, direct } = asked
    const worth = ({ slot, document, weight }: Kept) => (direct.matters ? weight * direct.factor(document, held.at(slot)) : weight)
    const scores = this.postings.score(question, held, this.choose(found, most, worth))
    const [scored, others]: [Scored[], Scored[]] = [[], []]
    let lowest = Infinity
    for (const entry of found) {
      entry.score = (scores[entry.kept.slot] ?? 0) * worth(entry.kept)
      if (entry.score > 0 && entry.score < lowest) lowest = entry.score
      ;(entry.score > 0 ? scored : others).push(entry)
    }
    for (const entry of others) entry.score = lowest * entry.coverage
    scored.sort(byScore)
    // Those that were not scored stand behind all that were; sorting thousands of them is only worth it for who turns that far.
    return scored.concat(wanted > scored.length ? others.sort(byScore) : others)
  }

  /** Marks the slots of at most `most` entries. */
  private choose(found: readonly Scored[], most: number, worth: (kept: Kept) => number): Uint8Array {
    const chosen = new Uint8Array(this.slots.length)
    // Worth decides only between equals: it is a small number, and coverages differ by far more than a millionth.
    const promise = ({ coverage, kept }: Scored) => coverage + worth(kept) * 1e-6
    const cut = found.length <= most ? -1 : nthLargest(found.map(promise), most)
    let room = most
    for (const entry of found) if (promise(entry) > cut) { chosen[entry.kept.slot] = 1; room-- }
    for (const entry of found) if (room > 0 && promise(entry) === cut) { chosen[entry.kept.slot] = 1; room-- }
    return chosen
  }

  /** Orders the best anew by `further`, what the first of them share: a long question means words that it does not say. */
  orderByShared(found: readonly Scored[], further: Question): Scored[] {
    const best = found.slice(0, mostScored)
    const chosen = new Uint8Array(this.slots.length)
    for (const { kept } of best) chosen[kept.slot] = 1
    const scores = this.postings.score(further, new HeldTerms(further.terms.length, 0), chosen)
    for (const entry of best) {
      entry.shared = (scores[entry.kept.slot] ?? 0) * entry.kept.weight
      entry.score += entry.shared
    }
    const [top, ...others] = best
    if (!top) return [...found]
    others.sort(byScore)
    // What others share says nothing against the best answer: it stays first (measured: one question in fifty lost it).
    const lift = Math.max(0, (others[0]?.score ?? 0) - top.score)
    top.shared += lift
    top.score += lift
    return [top, ...others, ...found.slice(mostScored)]
  }
}

const byScore = (a: Scored, b: Scored): number =>
  b.score - a.score || b.kept.document.createdAt - a.kept.document.createdAt || a.kept.document.id - b.kept.document.id

const nthLargest = (values: readonly number[], n: number): number => Float64Array.from(values).sort()[Math.max(0, values.length - n)] ?? 0

function passes(document: Omit<PackedDocument, 'texts'>, filters: SearchFilters): boolean {
  return (filters.kit === undefined || document.kit === filters.kit)
    && (filters.section === undefined || document.sections.includes(filters.section))
    && (filters.operation === undefined || document.operations.includes(filters.operation))
    && (filters.kind === undefined || document.kind === filters.kind)
    && (filters.stamped === undefined || document.stamped === filters.stamped)
}
