// What passes through the search door, as plain messages: the index lives in a worker thread. Shared by both sides; no I/O.
import type { TaskName } from '@/lib/domain/search/task-names'
import type { SearchExplanation } from './explanation'

/** Advice of one post: this task before that one. */
export interface OrderAdvice { postId: number; before: TaskName; after: TaskName }

/** One entry as the index sees it. Built in lib/search/build-document.ts from CautionedPosts. */
export interface SearchDocument {
  id: number
  kind: 'question' | 'lesson'
  kit: string
  sections: string[]
  operations: string[]
  tasks: string[]
  /** A visible answer or the lesson itself stands in state `stamped`. */
  stamped: boolean
  /** A question without a visible answer. */
  open: boolean
  createdAt: number
  title: string
  /** Labels that also find it: section codes and titles, task titles, hardware, plans pages and steps. */
  labels: string
  /** The entry itself first, then its visible answers; `weight` is the evidence factor from lib/domain/search. */
  passages: { postId: number; text: string; weight: number }[]
  /** Order advice of the entry and of its visible answers. */
  orderAdvice?: OrderAdvice[]
}

export interface SearchFilters {
  kit?: string | undefined
  section?: string | undefined
  operation?: string | undefined
  kind?: 'question' | 'lesson' | undefined
  stamped?: boolean | undefined
}

export interface SearchRequest { text: string; filters: SearchFilters; limit: number; offset: number }

/** Advice about the two tasks a question asks the order of, by task slug. */
export interface AdviceFound { postId: number; before: string; after: string }

export interface SearchHit {
  id: number
  postId: number
  score: number
  /** Words as they stand in the text, for marking. */
  terms: string[]
  /** Its order advice about the pair in question; absent when the question is none of order or it has none. */
  advice?: AdviceFound[]
}

export interface SearchAnswer {
  hits: SearchHit[]
  total: number
  /** Query words that were not searched (too many, or stop words only). */
  ignored: string[]
  didYouMean: string | null
  /** Sequence of the change log that this answer includes. */
  sequence: number
}

export interface SearchHealth {
  state: 'loading' | 'ready'
  documents: number
  sequence: number
  /** What the search thread has, heap and buffers, now and at most since it started; megabytes of 10⁶ bytes. */
  memoryMB: number
  highestMemoryMB: number
  /** What the index was filled from, and why not from a snapshot when it was not. Absent while that is not known. */
  startedFrom?: 'snapshot' | 'tables'
  because?: string
  /** The newest snapshot that this process saved or started from. */
  snapshot?: { sequence: number; savedAt: number; MB: number; seconds?: number; highestMemoryMB?: number }
}

export type WhenOrdered = (entryIds: number[]) => void

/** The asynchronous door. Nobody outside lib/search knows what stands behind it. */
export interface SearchDoor {
  /** `whenOrdered` hears the entries of the answer as soon as their order is known, while their passages are still being picked. */
  search(request: SearchRequest, whenOrdered?: WhenOrdered): Promise<SearchAnswer>
  /** Entries like this text: for asking. */
  similar(text: string, filters: SearchFilters, limit: number): Promise<SearchAnswer['hits']>
  /** Titles that complete what is being typed. */
  suggest(text: string, limit: number): Promise<{ id: number; title: string }[]>
  /** Why the hits of a search stand where they stand, said by what ranks them. */
  explain(request: SearchRequest): Promise<SearchExplanation>
  health(): SearchHealth
  /** Reads the change log now and resolves when everything committed before the call can be found. */
  catchUp(): Promise<void>
  close(): Promise<void>
}

/** Thrown by search, similar and suggest while the index loads. */
export class SearchLoadingError extends Error {
  /** By name: the framework bundles this file more than once, and the door of one bundle throws into another. */
  static override [Symbol.hasInstance](value: unknown): value is SearchLoadingError {
    return value instanceof Error && value.name === 'SearchLoadingError'
  }

  constructor() {
    super('Search is loading')
    this.name = 'SearchLoadingError'
  }
}
