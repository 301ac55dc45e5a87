// Which of an entry's posts shows best why it was found, and the words to mark in it.
import 'server-only'
import type { SearchDocument } from './messages'
import type { PlacedTermsOfTexts } from './placed-terms'
import type { Question } from './question'

const mostTerms = 40
/** More than any coverage × evidence. */
const preferredWorth = 2

const never: ReadonlySet<number> = new Set()

/**
 * The passage with most of the question × its evidence; the entry itself when nothing decides. `terms` also holds the title's words.
 * @param preferred posts that answer the question beyond their words, and so come first
 */
export function findPassage(document: SearchDocument, question: Question, texts: PlacedTermsOfTexts, preferred = never): { postId: number; terms: string[] } {
  let best = { postId: document.id, worth: 0, words: new Set<string>() }
  for (const { postId, text, weight } of document.passages) {
    const held = readMatches(text, question, texts)
    const worth = question.coverage((term) => held.terms.has(term)) * weight + (preferred.has(postId) ? preferredWorth : 0)
    if (worth > best.worth) best = { postId, worth, words: held.words }
  }
  const inTitle = readMatches(document.title, question, texts).words
  return { postId: best.postId, terms: [...new Set([...best.words, ...inTitle])].slice(0, mostTerms) }
}

function readMatches(text: string, question: Question, texts: PlacedTermsOfTexts): { terms: Set<number>; words: Set<string> } {
  const placed = texts.of(text)
  const terms = new Set<number>()
  const words = new Set<string>()
  // A plain loop: this runs for every word of every text that is shown.
  for (let place = 0; place < placed.terms.length; place++) {
    const number = question.find(placed.terms[place] ?? '')
    if (number === undefined) continue
    terms.add(number)
    words.add(text.slice(placed.starts[place], placed.ends[place]))
  }
  return { terms, words }
}
