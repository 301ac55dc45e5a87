// Which entry holds which term, how often, in packed lists of numbers, and the BM25 score over them. Entries are slots here, small numbers.
// MiniSearch keeps a map a term for this: at 100,000 entries its maps alone take 435 MB and loading them again longer than all of this
// index (DEVELOPERS.md). Its scores are those given here; tests/unit/search/postings.test.ts holds one against the other.
import 'server-only'
import type { SearchWeights } from '@/lib/domain/search/weights'
import { HeldTerms } from './held-terms'
import { PostingList } from './posting-list'
import type { Question } from './question'

export class Postings {
  private readonly lists = new Map<string, PostingList>()
  /** Different terms by slot: what BM25 takes for an entry's length, as MiniSearch does. */
  private lengths = new Uint32Array(1024)
  private entries = 0
  private totalLength = 0

  constructor(private readonly bm25: SearchWeights['bm25']) {}

  /** Entries that hold `term`. */
  frequency(term: string): number {
    return this.lists.get(term)?.length ?? 0
  }

  /** Bytes of the lists, as far as they are kept outside the heap. */
  get bytes(): number {
    let sum = this.lengths.byteLength
    for (const list of this.lists.values()) sum += list.bytes
    return sum
  }

  /** Puts a slot in that is not in, with its different terms and how often each stands there. */
  add(slot: number, terms: ReadonlyMap<string, number>): void {
    for (const [term, count] of terms) this.listOf(term).put(slot, count)
    this.noteLength(slot, terms.size)
  }

  /** The list of `term`, for who fills many slots at once and calls `noteLength` for each of them. */
  listOf(term: string): PostingList {
    const known = this.lists.get(term)
    if (known) return known
    const list = new PostingList()
    this.lists.set(term, list)
    return list
  }

  noteLength(slot: number, terms: number): void {
    if (slot >= this.lengths.length) {
      const longer = new Uint32Array(Math.max(slot + 1, Math.ceil(this.lengths.length * 1.5)))
      longer.set(this.lengths)
      this.lengths = longer
    }
    this.lengths[slot] = terms
    this.entries++
    this.totalLength += terms
  }

  /** Takes a slot out with the terms it was added with. */
  remove(slot: number, terms: Iterable<string>): void {
    for (const term of terms) {
      const list = this.lists.get(term)
      list?.remove(slot)
      if (list?.length === 0) this.lists.delete(term)
    }
    this.entries--
    this.totalLength -= this.lengths[slot] ?? 0
    this.lengths[slot] = 0
  }

  /** First pass: who holds what, among slots below `slots`. */
  findHeld(question: Question, slots: number): HeldTerms {
    const held = new HeldTerms(question.terms.length, slots)
    question.terms.forEach((term, number) => this.lists.get(term)?.forEach((slot) => held.note(slot, number)))
    return held
  }

  /** Second pass: BM25 by slot of those with `chosen[slot] === 1`, each term by the routes that hold; 0 for all others. */
  score(question: Question, held: HeldTerms, chosen: Uint8Array): Float64Array {
    const scores = new Float64Array(chosen.length)
    const averageLength = this.totalLength / Math.max(1, this.entries)
    question.terms.forEach((_, number) => this.scoreTerm(question, number, held, chosen, averageLength, (slot, points) => {
      scores[slot] = (scores[slot] ?? 0) + points
    }))
    return scores
  }

  /** The part of one term in what `score` gives, by slot. */
  scoreOfTerm(question: Question, term: number, held: HeldTerms, chosen: Uint8Array): Map<number, number> {
    const points = new Map<number, number>()
    this.scoreTerm(question, term, held, chosen, this.totalLength / Math.max(1, this.entries), (slot, ofTerm) => points.set(slot, ofTerm))
    return points
  }

  private scoreTerm(question: Question, number: number, held: HeldTerms, chosen: Uint8Array, averageLength: number, take: (slot: number, points: number) => void): void {
    const list = this.lists.get(question.terms[number] ?? '')
    if (!list) return
    const { k, b, d } = this.bm25
    const rarity = Math.log(1 + (this.entries - list.length + 0.5) / (list.length + 0.5))
    list.forEach((slot, count) => {
      if (chosen[slot] !== 1) return
      const weight = question.weight(number, held.at(slot))
      const length = 1 - b + (b * (this.lengths[slot] ?? 0)) / averageLength
      take(slot, weight * rarity * (d + (count * (k + 1)) / (count + k * length)))
    })
  }
}
