// Why the hits of a search stand where they stand: what a steward sees, and GET /api/search/explain gives.
import { z } from 'zod'
import { stampStateSchema } from './post'
import { hitSchema } from './search'

const share = z.number().min(0).max(1)

export const explainedQuerySchema = z.object({
  /** `share`: of the whole question, by rarity. `strength`: how much of the word counts as held. `weight`: factor on the text score. */
  concepts: z.array(z.object({
    word: z.string(), share,
    routes: z.array(z.object({ looksUp: z.string(), how: z.string(), weight: z.number(), strength: share, entries: z.int() })),
  })),
  ignored: z.array(z.string()), didYouMean: z.string().nullable(),
  /** Titles of the tasks on both sides of a question of order. */
  order: z.object({ one: z.array(z.string()), other: z.array(z.string()) }).nullable(),
  places: z.array(z.object({ page: z.string(), step: z.string() })),
})

export const explainedHitSchema = z.object({
  hit: hitSchema, coverage: share,
  holds: z.array(z.object({ word: z.string(), looksUp: z.string(), how: z.string(), strength: share })),
  /** Points add up to `text`. The counts say how often the term stands where. */
  terms: z.array(z.object({ looksUp: z.string(), weight: z.number(), points: z.number(), title: z.int(), labels: z.int(), passages: z.int() })),
  text: z.number(),
  evidence: z.object({
    factor: z.number(), postId: z.int(), kind: z.enum(['question', 'lesson', 'answer']), stamp: stampStateSchema, critical: z.boolean(),
    asWritten: z.int(), withChange: z.int(), didNotWork: z.int(), ofStamp: z.number(), ofOutcomes: z.number(),
  }),
  directness: z.number(), advises: z.boolean(), place: z.enum(['step', 'page']).nullable(),
  /** From what the first hits share, for questions of several words. */
  shared: z.number(),
  /** text × evidence × directness + shared. */
  score: z.number(),
})

export const searchExplanationSchema = z.object({
  query: explainedQuerySchema, documents: z.int(),
  /** Share of the question the best entry must hold for anything to be shown, what it holds, and below which share others are cut. */
  least: share, best: share, cutBelow: share,
  considered: z.int(), cut: z.int(), total: z.int(), hits: z.array(explainedHitSchema),
})

export type ExplainedQuery = z.infer<typeof explainedQuerySchema>
export type ExplainedHit = z.infer<typeof explainedHitSchema>
export type SearchExplanation = z.infer<typeof searchExplanationSchema>
