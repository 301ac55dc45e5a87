// What the index makes of a collection's questions: its own analysis and order, nothing rebuilt here.
import synonyms from '@/content/synonyms.json'
import { searchWeights, type SearchWeights } from '@/lib/domain/search/weights'
import { SearchIndex } from '@/lib/search/search-index'
import type { Collection, JudgedQuestion } from './collection'
import { meanOf, scoresOf, type Scores } from './metrics'

export interface Answered { question: JudgedQuestion; /** Best first. */ found: string[]; didYouMean: string | null; scores: Scores }

export interface Evaluation {
  answered: Answered[]
  /** Means over the questions that have an answer. */
  mean: Scores
  byStyle: { style: string; questions: number; mean: Scores }[]
  /** Questions with nothing to find, and how many of them were told so. */
  absent: { questions: number; nothing: number }
}

/** As deep as average precision needs; only the passages of what is asked for are picked. */
const depth = 1_000

/** An index filled with the collection, made the way lib/search/worker.ts makes the server's. */
export function indexOf({ documents }: Collection, weights: SearchWeights = searchWeights): SearchIndex {
  const index = new SearchIndex({ twoWay: synonyms.twoWay, oneWay: synonyms.oneWay.map(({ from, to }) => ({ from, to: Array.isArray(to) ? to : [to] })) }, weights)
  for (const document of documents) index.put(document)
  return index
}

/** Asks every question (or those of `questions`) and scores what comes. */
export function evaluate(collection: Collection, weights: SearchWeights = searchWeights, questions: readonly JudgedQuestion[] = collection.questions): Evaluation {
  const index = indexOf(collection, weights)
  return summarise(questions.map((question) => ask(index, question, collection)))
}

export function summarise(answered: Answered[]): Evaluation {
  const present = answered.filter(({ question }) => !question.absent)
  const absent = answered.filter(({ question }) => question.absent)
  const styles = [...new Set(present.map(({ question }) => question.style))].sort()
  return {
    answered, mean: meanOf(present.map(({ scores }) => scores)),
    byStyle: styles.map((style) => {
      const own = present.filter(({ question }) => question.style === style)
      return { style, questions: own.length, mean: meanOf(own.map(({ scores }) => scores)) }
    }),
    absent: { questions: absent.length, nothing: absent.filter(({ found }) => found.length === 0).length },
  }
}

export function ask(index: SearchIndex, question: JudgedQuestion, { names, thresholds }: Collection): Answered {
  const { ordered, didYouMean } = orderOf(index, question.text)
  const found = ordered.map((id) => names.get(id) ?? '')
  return { question, found, didYouMean, scores: scoresOf(found, question.gains, thresholds) }
}

/** The order is told before passages are picked: a thousand of them would take most of the time. */
function orderOf(index: SearchIndex, text: string): { ordered: number[]; didYouMean: string | null } {
  let ordered: number[] = []
  const stop = new Error('the order is known')
  try {
    const { didYouMean } = index.search({ text, filters: {}, limit: depth, offset: 0 }, (ids) => {
      ordered = ids
      if (ids.length > 20) throw stop
    })
    return { ordered, didYouMean }
  } catch (error) {
    if (error !== stop) throw error
    return { ordered, didYouMean: null }
  }
}
