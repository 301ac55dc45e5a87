// What is told of why hits stand where they stand, as plain messages. How it is found out is explain-hits.ts.
import type { RouteKind } from '@/lib/domain/search/name-route'
import type { AdviceFound } from './messages'

/** One way by which an entry can hold a concept. */
export interface ExplainedRoute {
  /** What is looked up, in words. */
  looksUp: string
  how: RouteKind
  /** Factor on the text score. */
  weight: number
  /** Share of the concept that counts as covered, 0 … 1. */
  strength: number
  /** Entries that hold it. */
  entries: number
}

export interface ExplainedConcept {
  word: string
  /** Share of the whole question, 0 … 1: by rarity. */
  share: number
  routes: ExplainedRoute[]
}

export interface ExplainedTerm {
  looksUp: string
  /** Factor of the routes it completes. */
  weight: number
  /** Its part of the text score: BM25 × weight. */
  points: number
  /** How often it stands where. */
  title: number
  labels: number
  passages: number
}

export interface ExplainedHit {
  id: number
  coverage: number
  /** Concepts that are held, and by what. */
  holds: { word: string; looksUp: string; how: RouteKind; strength: number }[]
  terms: ExplainedTerm[]
  /** Sum of the points of its terms; 0 when it was beyond what is scored. */
  text: number
  evidence: number
  /** The post whose evidence counts. */
  evidenceOf: number
  directness: number
  advises: boolean
  advice: AdviceFound[]
  place: 'step' | 'page' | null
  /** From what the first hits share, for questions of several words; 0 otherwise. */
  shared: number
  /** text × evidence × directness + shared. */
  score: number
}

export interface SearchExplanation {
  /** Entries in the index. */
  documents: number
  concepts: ExplainedConcept[]
  ignored: string[]
  didYouMean: string | null
  /** Task slugs on both sides of a question of order. */
  order: { one: string[]; other: string[] } | null
  places: { page: string; step: string }[]
  /** Share the best entry must cover for anything to be shown, and what it covers. */
  least: number
  best: number
  /** Share of the question below which an entry is cut: a quarter of what the best one covers. */
  cutBelow: number
  /** Entries that hold a word of the question and pass the filters. */
  considered: number
  cut: number
  total: number
  hits: ExplainedHit[]
}
