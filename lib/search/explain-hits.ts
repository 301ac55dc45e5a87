// Why hits stand where they stand: what ranked them, asked again entry by entry and put into words. No formula of its own.
import 'server-only'
import { decidingPassage } from '@/lib/domain/search/entry-weight'
import { directness } from '@/lib/domain/search/directness'
import { nameRoute, nameTerms } from '@/lib/domain/search/name-route'
import type { Concept } from '@/lib/domain/search/understand-query'
import type { Synonyms } from '@/lib/domain/search/synonyms'
import type { AskedDirectly } from './asked-directly'
import type { ExplainedConcept, ExplainedHit, ExplainedTerm, SearchExplanation } from './explanation'
import type { HeldTerms } from './held-terms'
import type { SearchDocument } from './messages'
import type { PlacedTermsOfTexts } from './placed-terms'
import type { Postings } from './postings'
import type { Question } from './question'

export interface RankedHit { kept: { slot: number; document: SearchDocument; weight: number }; coverage: number; score: number; shared: number }

export interface RankedBy {
  question: Question
  direct: AskedDirectly
  held: HeldTerms
  found: readonly unknown[]
  least: number
  best: number
  cutBelow: number
  considered: number
  postings: Postings
  placed: PlacedTermsOfTexts
  synonyms: Synonyms
  frequency(term: string): number
}

type Explained = Omit<SearchExplanation, 'documents' | 'ignored' | 'didYouMean' | 'places'>

/** Explains the hits of one page and the question they were ranked by. */
export function explainHits(page: readonly RankedHit[], by: RankedBy): Explained {
  const { question, direct, least, best, cutBelow, considered, found } = by
  const points = pointsOf(page, by)
  return {
    concepts: question.covering(() => false).map(({ concept }) => explainConcept(concept, by)),
    order: direct.order === null ? null : { one: [...direct.order.one], other: [...direct.order.other] },
    least, best, cutBelow, considered, cut: considered - found.length, total: found.length,
    hits: page.map((hit) => explainHit(hit, points, by)),
  }
}

function explainConcept(concept: Concept, { question, synonyms, frequency }: RankedBy): ExplainedConcept {
  const { word, mass, routes } = concept
  return {
    word, share: question.mass === 0 ? 0 : mass / question.mass,
    routes: routes.map((route) => ({
      looksUp: nameTerms(route.terms, synonyms), how: nameRoute(concept, route), weight: route.weight, strength: route.strength,
      entries: Math.min(...route.terms.map(frequency)),
    })),
  }
}

/** Points by term and slot, of the entries on the page only. */
function pointsOf(page: readonly RankedHit[], { question, held, postings }: RankedBy): ReadonlyMap<number, number>[] {
  const chosen = new Uint8Array(held.size)
  for (const { kept } of page) chosen[kept.slot] = 1
  return question.terms.map((_, term) => postings.scoreOfTerm(question, term, held, chosen))
}

function explainHit({ kept: { slot, document, weight }, coverage, score, shared }: RankedHit, points: readonly ReadonlyMap<number, number>[], by: RankedBy): ExplainedHit {
  const { question, direct, held, synonyms } = by
  const read = direct.read(document, held.at(slot))
  const terms = question.terms.flatMap((term, number): ExplainedTerm[] => {
    const ofTerm = points[number]?.get(slot) ?? 0
    return ofTerm > 0 ? [{ looksUp: nameTerms([term], synonyms), weight: question.weight(number, held.at(slot)), points: ofTerm, ...whereItStands(term, document, by) }] : []
  })
  return {
    id: document.id, coverage, score, shared,
    holds: question.covering(held.at(slot)).flatMap(({ concept, route }) => (route ? [{ word: concept.word, looksUp: nameTerms(route.terms, synonyms), how: nameRoute(concept, route), strength: route.strength }] : [])),
    terms: terms.sort((a, b) => b.points - a.points), text: terms.reduce((sum, term) => sum + term.points, 0),
    evidence: weight, evidenceOf: decidingPassage(document)?.postId ?? document.id, directness: directness(read), advice: direct.advice(document), ...read,
  }
}

function whereItStands(term: string, document: SearchDocument, { placed }: RankedBy): Pick<ExplainedTerm, 'title' | 'labels' | 'passages'> {
  const count = (text: string) => placed.of(text).terms.filter((other) => other === term).length
  return { title: count(document.title), labels: count(document.labels), passages: document.passages.reduce((sum, { text }) => sum + count(text), 0) }
}
