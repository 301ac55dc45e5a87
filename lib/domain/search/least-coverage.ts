// When to say plainly that nothing is to be found, instead of showing entries that share a common word with the question.
import { searchWeights, type SearchWeights } from './weights'

/**
 * Share of a question's mass (the rarity of its concepts) that the best entry must cover for anything to be shown.
 * Two or three words are each meant; in a long sentence many are by the way. Fitted on a trade collection with questions
 * that have no answer, and held against 225 long questions that all have some.
 * @param concepts how many concepts the question has
 */
export function leastCoverage(concepts: number, { short, perConcept, least }: SearchWeights['coverage'] = searchWeights.coverage): number {
  return Math.max(least, short - perConcept * Math.max(0, concepts - 3))
}
