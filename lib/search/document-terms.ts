// Which terms an entry is indexed under: title several times, labels once, its passages, the synonym groups they stand in,
// and the values of their measurements.
import 'server-only'
import { analyseText } from '@/lib/domain/search/analyse-text'
import { findValues } from '@/lib/domain/search/number-terms'
import type { Synonyms } from '@/lib/domain/search/synonyms'
import type { SearchDocument } from './messages'

export interface DocumentTerms {
  /** With repetition: how often a term stands there is what ranks. */
  all: string[]
  /** Different words as written (lower case), for spelling and completion. */
  words: Set<string>
}

/**
 * Terms of an entry; the same document always gives the same terms, so that it can be counted out again.
 * The title weighs by repetition, because one joined field ranks better than several (measured).
 */
export function termsOfDocument(document: SearchDocument, synonyms: Synonyms, titleRepeats: number): DocumentTerms {
  const result: DocumentTerms = { all: [], words: new Set() }
  const title = readPart(document.title, synonyms, result)
  for (let repeat = 1; repeat < titleRepeats; repeat++) result.all.push(...title)
  readPart(document.labels, synonyms, result)
  for (const passage of document.passages) readPart(passage.text, synonyms, result)
  return result
}

function readPart(text: string, synonyms: Synonyms, result: DocumentTerms): string[] {
  const { tokens } = analyseText(text)
  const terms: string[] = []
  for (const token of tokens) {
    terms.push(token.term, ...token.also)
    if (token.word.length > 2) result.words.add(token.word)
  }
  for (const match of synonyms.labelText(tokens)) terms.push(...match.terms)
  for (const value of findValues(text)) terms.push(...value.terms)
  for (const term of terms) result.all.push(term)
  return terms
}

/** How often each term stands there. */
export function countTerms(terms: readonly string[]): Map<string, number> {
  const counts = new Map<string, number>()
  for (const term of terms) counts.set(term, (counts.get(term) ?? 0) + 1)
  return counts
}
