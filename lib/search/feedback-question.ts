// What is asked a second time of a long question: the words that the entries found first share. It only adds to scores, so that
// nothing is found by it alone, and what nobody has is still told plainly.
import 'server-only'
import { feedbackTerms, type FoundTerms } from '@/lib/domain/search/feedback-terms'
import { rarity } from '@/lib/domain/search/understand-query'
import type { SearchWeights } from '@/lib/domain/search/weights'
import { Question } from './question'

/** Postings read for it: the commonest words are left out in a large corpus, as they are of what was typed. */
const mostPostings = 60_000

interface Counted { documents: number; frequency(term: string): number }

/** Null when the entries found first share nothing that is worth asking for. */
export function feedbackQuestion(found: readonly FoundTerms[], asked: Question, { documents, frequency }: Counted, { terms, weight }: SearchWeights['feedback']): Question | null {
  let postings = 0
  const affordable = feedbackTerms(found, new Set(asked.terms), (term) => rarity(frequency(term), documents), terms).filter(({ term }) => {
    postings += frequency(term)
    if (postings <= mostPostings) return true
    postings -= frequency(term)
    return false
  })
  if (affordable.length === 0) return null
  return new Question(affordable.map(({ term, share }) => ({ word: term, mass: 0, routes: [{ terms: [term], weight: weight * share, strength: 0 }] })))
}
