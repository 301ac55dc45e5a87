// A route in words: what it looks up and why, told from the word as typed. For showing only; routes are made in understand-query.ts.
import { analyseText } from './analyse-text'
import { valueMark } from './number-terms'
import { groupMark, type Synonyms } from './synonyms'
import type { Concept, Route } from './understand-query'

export type RouteKind = 'as written' | 'broader spelling' | 'synonym' | 'joined' | 'split' | 'half typed' | 'meant' | 'plans step' | 'plans page' | 'same value'

/** Why a concept is looked up by one of its routes. */
export function nameRoute({ word, routes }: Pick<Concept, 'word' | 'routes'>, { terms }: Pick<Route, 'terms'>): RouteKind {
  const [term = ''] = terms
  if (term.startsWith(groupMark)) return 'synonym'
  if (term.startsWith(valueMark)) return 'same value'
  if (term.includes('§')) return term.endsWith('§') ? 'plans page' : 'plans step'
  if (terms.length > 1) return 'split'
  const { tokens } = analyseText(word)
  if (tokens.some((token) => token.term === term)) return 'as written'
  if (tokens.some((token) => token.also.includes(term))) return 'broader spelling'
  const [typed] = tokens
  if (!typed || typed.word === '' || !term.includes(typed.term)) return 'meant'
  // Two words written as one hold either; only what no entry holds as typed is completed.
  const isKnown = routes.some((route) => route.terms.length === 1 && route.terms[0] === typed.term)
  return !isKnown && term.startsWith(typed.word) ? 'half typed' : 'joined'
}

/** Terms as they are said: a group by its first phrases, a step with its page. */
export function nameTerms(terms: readonly string[], synonyms: Pick<Synonyms, 'phrasesOf'>): string {
  return terms.map((term) => nameTerm(term, synonyms)).join(' + ')
}

function nameTerm(term: string, synonyms: Pick<Synonyms, 'phrasesOf'>): string {
  if (term.startsWith(groupMark)) return synonyms.phrasesOf(term).slice(0, 3).join(', ') || term
  if (term.startsWith(valueMark)) return valueWords(term.slice(valueMark.length))
  const [page, step] = term.split('§')
  if (step === undefined) return term
  return step === '' ? `any step of ${page}` : `${page} step ${step}`
}

/** "in=0.0980" reads "0.0980 in"; grid points of other kinds stay as the index has them. */
const valueWords = (token: string): string => (/^in=/.test(token) ? `${token.slice(3)} in` : token)
