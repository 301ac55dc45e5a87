// Which of an entry's posts shows best why it was found, and the words to mark in it.
import 'server-only'
import { analyseText } from '@/lib/domain/search/analyse-text'
import type { Synonyms } from '@/lib/domain/search/synonyms'
import type { SearchDocument } from './messages'
import type { Question } from './question'

const mostTerms = 40

/** The passage with most of the question × its evidence; the entry itself when nothing decides. `terms` also holds the title's words. */
export function findPassage(document: SearchDocument, question: Question, synonyms: Synonyms): { postId: number; terms: string[] } {
  let best = { postId: document.id, worth: 0, words: new Set<string>() }
  for (const { postId, text, weight } of document.passages) {
    const held = readMatches(text, question, synonyms)
    const worth = question.coverage((term) => held.terms.has(term)) * weight
    if (worth > best.worth) best = { postId, worth, words: held.words }
  }
  const inTitle = readMatches(document.title, question, synonyms).words
  return { postId: best.postId, terms: [...new Set([...best.words, ...inTitle])].slice(0, mostTerms) }
}

function readMatches(text: string, question: Question, synonyms: Synonyms): { terms: Set<number>; words: Set<string> } {
  const { tokens } = analyseText(text)
  const terms = new Set<number>()
  const words = new Set<string>()
  for (const token of tokens) {
    for (const term of [token.term, ...token.also]) {
      const number = question.find(term)
      if (number === undefined) continue
      terms.add(number)
      words.add(text.slice(token.start, token.end))
    }
  }
  for (const { first, last, terms: groups } of synonyms.labelText(tokens)) {
    for (const group of groups) {
      const number = question.find(group)
      if (number === undefined) continue
      terms.add(number)
      words.add(text.slice(tokens[first]?.start, tokens[last]?.end))
    }
  }
  return { terms, words }
}
