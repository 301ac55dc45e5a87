// From what somebody typed to what is looked up: concepts, each with the routes by which an entry can hold it.
// Pure: what the corpus knows comes in as `Corpus`; scoring and MiniSearch stand in lib/search.
import { analyseText, stemOf, type Token } from './analyse-text'
import { findMeantWords, splitCompound } from './find-meant-words'
import { findValueRoutes, joinRoutes, type ValueOfTokens } from './number-routes'
import { isAskedAround } from './order-question'
import { readPlaces, type AskedPlace } from './place-concepts'
import type { Synonyms } from './synonyms'
import type { Candidate, Vocabulary } from './vocabulary'
import type { SearchWeights } from './weights'

export interface Corpus {
  documents: number
  /** Entries that hold a term (stem, number, designation, group). */
  frequency(term: string): number
  vocabulary: Vocabulary
  synonyms: Synonyms
  /** How much each kind of route counts. */
  factor: SearchWeights['factor']
}

/** One way to hold a concept: all of `terms`. */
export interface Route {
  terms: readonly string[]
  /** Factor on the text score; 1 = the word itself. */
  weight: number
  /** Share of the concept that is covered, 0 … 1. */
  strength: number
  /** Adds to the score only where this term is not held: another spelling of the same says nothing more. */
  unless?: string
}

export interface Concept {
  /** As typed. */
  word: string
  /** What it weighs in coverage: its rarity. A word no entry holds weighs most, because it is missed most. */
  mass: number
  routes: readonly Route[]
}

export interface UnderstoodQuery {
  concepts: Concept[]
  /** Steps of plans pages that are asked for. */
  places: AskedPlace[]
  ignored: string[]
  didYouMean: string | null
}

export interface QueryOptions {
  mostConcepts: number
  /** The last word may be half typed. */
  completeLast: boolean
  correct: boolean
}

const shortestPrefix = 3
const mostCompletions = 16
const mostCorrected = 8

/** Reads `text` for this corpus. Never throws; at most `mostConcepts` concepts, the rarest, the rest named in `ignored`. */
export function understandQuery(text: string, corpus: Corpus, options: QueryOptions): UnderstoodQuery {
  const { tokens, stopped } = analyseText(text)
  if (tokens.length === 0) return { concepts: [], places: [], ignored: distinct(stopped), didYouMean: null }
  const { places, concepts: placed, taken } = readPlaces(text, tokens, corpus, (frequency) => rarity(frequency, corpus.documents))
  const isAround = isAskedAround(text)
  const words = tokens.filter((token, place) => !taken.has(place) && !isAround(token.word))
  const drafts = draftConcepts(text, words, corpus)
  const { kept, dropped } = keepRarest(drafts, Math.max(0, options.mostConcepts - placed.length))
  const corrections = options.correct || options.completeLast ? fillUnknown(kept, words, text, corpus, options) : []
  return {
    concepts: [
      ...placed.slice(0, options.mostConcepts),
      ...kept.filter((draft) => draft.mass > 0).map(({ token, mass, routes }) => ({ word: text.slice(token.start, token.end), mass, routes })),
    ],
    places,
    ignored: distinct([...placed.slice(options.mostConcepts).map(({ word }) => word), ...dropped.map(({ token }) => text.slice(token.start, token.end))]),
    didYouMean: corrections.length > 0 ? replaceWords(text, corrections) : null,
  }
}

/** Inverse document frequency as BM25 has it. */
export function rarity(frequency: number, documents: number): number {
  return Math.log(1 + (Math.max(0, documents - frequency) + 0.5) / (frequency + 0.5))
}

interface Draft { token: Token; position: number; mass: number; known: boolean; routes: Route[] }

function draftConcepts(text: string, tokens: readonly Token[], corpus: Corpus): Draft[] {
  const drafts = new Map<string, Draft>()
  tokens.forEach((token, position) => {
    if (!drafts.has(token.term)) drafts.set(token.term, draftOf(token, position, corpus))
  })
  for (const { first, last, terms } of corpus.synonyms.widenQuery(tokens)) {
    for (const token of tokens.slice(first, last + 1)) widen(drafts.get(token.term), terms, last - first + 1, corpus)
  }
  for (const value of findValueRoutes(text, tokens, (term) => corpus.frequency(term))) widenByValue(drafts, value, corpus)
  joinNeighbours(tokens, drafts, corpus)
  return [...drafts.values()]
}

function draftOf(token: Token, position: number, corpus: Corpus): Draft {
  const frequency = corpus.frequency(token.term)
  const scale = token.kind === 'unit' ? corpus.factor.unit : 1
  const routes: Route[] = frequency > 0 ? [{ terms: [token.term], weight: scale, strength: 1 }] : []
  for (const term of token.also) {
    if (corpus.frequency(term) > 0) routes.push({ terms: [term], weight: corpus.factor.also * scale, strength: frequency > 0 ? 0.6 : 0.8 })
  }
  const known = routes.length > 0
  const split = token.kind === 'word' && frequency > 0 && token.word.length >= 7 ? splitCompound(token.word, corpus.vocabulary) : null
  if (split) routes.push({ terms: split.map(stemOf), weight: corpus.factor.splitKnown, strength: 0.7 })
  const missing = token.kind === 'word' ? 1 : corpus.factor.unknownNumber
  const rarest = Math.max(frequency, ...token.also.map((term) => corpus.frequency(term)))
  return { token, position, known, mass: rarity(rarest, corpus.documents) * (known ? 1 : missing) * scale, routes }
}

/** The words themselves come first: with a group behind it a concept weighs no more than without. */
function widen(draft: Draft | undefined, terms: readonly string[], length: number, corpus: Corpus): void {
  if (!draft) return
  const present = terms.filter((term) => corpus.frequency(term) > 0)
  for (const term of present) draft.routes.push({ terms: [term], weight: corpus.factor.synonym / Math.sqrt(length), strength: 0.9 })
  if (present.length > 0 && !draft.known) {
    draft.known = true
    draft.mass = rarity(Math.max(...present.map((term) => corpus.frequency(term))), corpus.documents)
  }
}

/** A number is also looked up by its value. */
function widenByValue(drafts: Map<string, Draft>, value: ValueOfTokens, corpus: Corpus): void {
  for (const token of value.tokens) {
    const draft = drafts.get(token.term)
    if (!draft) continue
    draft.routes = joinRoutes(draft.routes, token, value)
    if (draft.known || value.routes.length === 0) continue
    const scale = token.kind === 'unit' ? corpus.factor.unit : 1
    Object.assign(draft, { known: true, mass: rarity(Math.max(...value.routes.map(({ term }) => corpus.frequency(term))), corpus.documents) * scale })
  }
}

/** `nut plate` also looks up nutplate, when an entry writes it so. */
function joinNeighbours(tokens: readonly Token[], drafts: Map<string, Draft>, corpus: Corpus): void {
  tokens.slice(1).forEach((token, index) => {
    const before = tokens[index]
    if (!before || before.word === '' || token.word === '') return
    const term = stemOf(before.word + token.word)
    if (corpus.frequency(term) === 0) return
    for (const draft of [drafts.get(before.term), drafts.get(token.term)]) {
      draft?.routes.push({ terms: [term], weight: corpus.factor.joined, strength: 1, unless: draft.token.term })
      if (draft && !draft.known) Object.assign(draft, { known: true, mass: rarity(corpus.frequency(term), corpus.documents) })
    }
  })
}

/** Known words by rarity, then unknown ones in the order typed: rubbish must not push out what can be found. */
function keepRarest(drafts: Draft[], most: number): { kept: Draft[]; dropped: Draft[] } {
  const ranked = [...drafts].sort((a, b) => Number(b.known) - Number(a.known) || (a.known ? b.mass - a.mass : 0) || a.position - b.position)
  const inOrder = (list: Draft[]) => list.sort((a, b) => a.position - b.position)
  return { kept: inOrder(ranked.slice(0, most)), dropped: inOrder(ranked.slice(most)) }
}

interface Correction { token: Token; word: string }

/** Gives routes to words that no entry holds: completed when half typed, else corrected, else split. */
function fillUnknown(kept: Draft[], tokens: readonly Token[], text: string, corpus: Corpus, options: QueryOptions): Correction[] {
  const corrections: Correction[] = []
  const lastTyped = tokens.at(-1)
  for (const draft of kept.filter((d) => !d.known && d.token.kind === 'word').slice(0, mostCorrected)) {
    const { token } = draft
    const isHalfTyped = options.completeLast && token === lastTyped && token.end === text.length && token.word.length >= shortestPrefix
    const completed = isHalfTyped ? corpus.vocabulary.startingWith(token.word, mostCompletions) : []
    if (completed.length > 0) {
      addRoutes(draft, completed, { weights: [], otherwise: corpus.factor.completed, certainty: 1 }, corpus)
      continue
    }
    if (!options.correct) continue
    const meant = findMeantWords(token.word, corpus.vocabulary)
    const split = (meant[0]?.cost ?? Infinity) <= 1 ? null : splitCompound(token.word, corpus.vocabulary)
    if (split) {
      draft.routes.push({ terms: split.map(stemOf), weight: corpus.factor.splitUnknown, strength: 1 })
      corrections.push({ token, word: split.join(' ') })
    } else if (meant[0]) {
      // Three letters with a slip may be anything: what is found by them counts half, and its loss in full.
      addRoutes(draft, meant, { weights: corpus.factor.corrected, otherwise: 0.4, certainty: token.word.length <= 3 ? 0.5 : 1 }, corpus)
      corrections.push({ token, word: meant[0].word })
    }
  }
  return corrections
}

interface Trust { weights: readonly number[]; otherwise: number; certainty: number }

function addRoutes(draft: Draft, candidates: readonly Candidate[], { weights, otherwise, certainty }: Trust, corpus: Corpus): void {
  const stems = distinct(candidates.map((candidate) => stemOf(candidate.word)))
  stems.forEach((term, rank) => {
    const weight = weights[rank] ?? otherwise
    draft.routes.push({ terms: [term], weight, strength: certainty })
    // A word meant by mistake is still a word of the trade, with all that it is called.
    for (const group of groupsOf(term, corpus)) draft.routes.push({ terms: [group], weight: weight * corpus.factor.synonym, strength: 0.9 * certainty })
  })
  if (certainty === 1) draft.mass = rarity(Math.max(...stems.map((term) => corpus.frequency(term))), corpus.documents)
}

function groupsOf(term: string, corpus: Corpus): string[] {
  const token: Token = { term, also: [], kind: 'word', word: term, start: 0, end: 0 }
  return corpus.synonyms.widenQuery([token]).flatMap((match) => match.terms).filter((group) => corpus.frequency(group) > 0)
}

function replaceWords(text: string, corrections: readonly Correction[]): string {
  let result = text
  for (const { token, word } of [...corrections].sort((a, b) => b.token.start - a.token.start)) {
    result = result.slice(0, token.start) + word + result.slice(token.end)
  }
  return result.replace(/\s+/gu, ' ').trim()
}

const distinct = (words: readonly string[]): string[] => [...new Set(words)]
