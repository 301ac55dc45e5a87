// What passes between the search door and the worker thread, both ways. Every request gets one reply with its number.
import 'server-only'
import type { SearchExplanation } from './explanation'
import type { SearchAnswer, SearchDocument, SearchFilters, SearchRequest } from './messages'
import type { FoundSnapshot } from './snapshot/snapshot-folder'
import type { FactsOfDatabase, WrittenPieces } from './snapshot/snapshot-saver'

/** Entries to put and to take out, and the change sequence that is reached with them. */
export interface Changes { put: SearchDocument[]; remove: number[]; sequence: number }

/** How many entries the thread holds, and the memory it has for it. */
export interface Filled { documents: number; memoryMB: number }

export interface WorkerCalls {
  apply: { asked: Changes; given: Filled }
  search: { asked: SearchRequest; given: SearchAnswer }
  similar: { asked: { text: string; filters: SearchFilters; limit: number }; given: SearchAnswer['hits'] }
  suggest: { asked: { text: string; limit: number }; given: { id: number; title: string }[] }
  explain: { asked: SearchRequest; given: SearchExplanation }
  memory: { asked: null; given: Filled }
  listSnapshots: { asked: { folder: string }; given: FoundSnapshot[] }
  loadSnapshot: { asked: { file: string }; given: Filled | { refused: string } }
  writeSnapshot: { asked: { temporary: string }; given: WrittenPieces }
  sealSnapshot: { asked: { facts: FactsOfDatabase; folder: string }; given: { MB: number } }
}

export type CallName = keyof WorkerCalls
export type WorkerRequest = { [Name in CallName]: { call: Name; number: number; asked: WorkerCalls[Name]['asked'] } }[CallName]
/** `ordered` comes before the reply to a search, and is none. */
export type WorkerReply = { number: number; given: WorkerCalls[CallName]['given'] } | { number: number; failed: string } | { number: number; ordered: number[] }
