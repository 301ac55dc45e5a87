// Which entry holds which term, how often: MiniSearch over one joined field. Entries are slots here, small numbers.
// MiniSearch multiplies a score by the number of matched terms and makes objects of every match; both are kept away here.
import 'server-only'
import MiniSearch, { type SearchResult } from 'minisearch'
import type { SearchWeights } from '@/lib/domain/search/weights'
import { HeldTerms } from './held-terms'
import type { Question } from './question'

export class Postings {
  private readonly mini: MiniSearch<{ id: number; terms: string }>

  constructor(bm25: SearchWeights['bm25']) {
    this.mini = new MiniSearch({
      fields: ['terms'],
      tokenize: (text) => text.split('\n'),
      processTerm: (term) => term,
      searchOptions: { combineWith: 'OR', bm25 },
    })
  }

  add(slot: number, terms: readonly string[]): void {
    this.mini.add({ id: slot, terms: terms.join('\n') })
  }

  /** Takes a slot out with the terms it was added with. Postings left to MiniSearch's vacuum would count as entries meanwhile and turn rarities negative. */
  remove(slot: number, terms: readonly string[]): void {
    this.mini.remove({ id: slot, terms: terms.join('\n') })
  }

  /** First pass: who holds what, among slots below `slots`. Every posting is refused a score, so no result is made of it. */
  findHeld(question: Question, slots: number): HeldTerms {
    const held = new HeldTerms(question.terms.length, slots)
    this.search(question, (slot, term) => {
      held.note(slot, term)
      return 0
    })
    return held
  }

  /** Second pass: BM25 by slot of those with `chosen[slot] === 1`, each term by the routes that hold; 0 for all others. */
  score(question: Question, held: HeldTerms, chosen: Uint8Array): Float64Array {
    const scores = new Float64Array(chosen.length)
    const weigh = (slot: number, term: number) => (chosen[slot] === 1 ? question.weight(term, held.at(slot)) : 0)
    // Taken as MiniSearch comes by, and refused as results: it would only sort them.
    this.search(question, weigh, ({ id, score, queryTerms }) => {
      scores[Number(id)] = score / Math.max(1, queryTerms.length)
    })
    return scores
  }

  /** The part of one term in what `score` gives, by slot. */
  scoreOfTerm(question: Question, term: number, held: HeldTerms, chosen: Uint8Array): Map<number, number> {
    const points = new Map<number, number>()
    const weigh = (slot: number, number: number) => (chosen[slot] === 1 ? question.weight(number, held.at(slot)) : 0)
    this.search(question, weigh, ({ id, score }) => points.set(Number(id), score), [question.terms[term] ?? ''])
    return points
  }

  private search(question: Question, weigh: (slot: number, term: number) => number, take?: (result: SearchResult) => void, terms = question.terms): void {
    let last = ''
    let number = 0
    this.mini.search(terms.join('\n'), {
      filter: (result) => {
        take?.(result)
        return false
      },
      boostDocument: (id, term) => {
        // MiniSearch comes term by term, so the number is looked up once a term and not once a posting.
        if (term !== last) {
          last = term
          number = question.find(term) ?? 0
        }
        return weigh(Number(id), number)
      },
    })
  }
}
