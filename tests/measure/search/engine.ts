// What every engine that is measured has to offer. Each runs in a process of its own, so that memory is its own.
import type { AskedQuestion } from './questions'

export interface EngineTask { engine: EngineName; size: number; seed: number; directory: string; databaseFile: string }
export type EngineName = 'product' | 'fts5-any' | 'fts5-all' | 'minisearch'

export interface Engine {
  /** Answers with the ids of at most twenty entries, best first. */
  ask(question: AskedQuestion): Promise<number[]>
  /** Files the engine keeps, in MB; null when it has none. */
  fileMB?: number | null
  close(): Promise<void>
}

/** How an engine came up. */
export interface Start { engine: Engine; buildSeconds: number; /** From what was saved; a sentence when there is no such thing. */ startSeconds: number | string; indexMB?: IndexMB; saveSeconds?: number }

/** What the search thread has, by its own count: after building, after starting from the snapshot, and at most while one was saved. */
export interface IndexMB { built: number; restored: number; saving: number }

export const hitsWanted = 20
