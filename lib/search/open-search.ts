// The search door of a process: starts the thread, fills it from the database, and follows the change log.
// Nobody tells it of a write; what another process committed is found the same way.
import 'server-only'
import type { Database } from '@/db/client'
import { currentSequence, listChangesAfter, listVisibleEntryIds } from '@/db/queries/search'
import type { SearchExplanation } from './explanation'
import { SearchLoadingError, type SearchAnswer, type SearchDoor, type SearchFilters, type SearchHealth, type SearchRequest, type WhenOrdered } from './messages'
import { DocumentReader, readTitles } from './read-documents'
import { SearchThread } from './search-thread'
import { SnapshotKeeper, type SnapshotSettings, type Tell } from './snapshot/snapshot-keeper'
import type { Changes, Filled } from './worker-messages'

export interface SearchSettings {
  database: Database
  /** The bundle dist/workers/search.mjs. */
  workerFile: string
  /** How often the change log is read for what other processes wrote. */
  pollMs?: number
  /** Where the index is kept between two starts; absent = nowhere, and every start reads the tables. */
  snapshots?: SnapshotSettings
  /** Hears what the index was filled from, and of snapshots. */
  onEvent?: Tell
  /** Hears of a thread that ended and of a log that could not be read; both are tried again. */
  onError?: (error: unknown) => void
}

const callTimeoutMs = 5_000
const applyTimeoutMs = 60_000
const longestWaitMs = 30_000
const memoryEveryMs = 2_000
const idsARead = 400
const changesARead = 500

/** Opens search. Returns at once; the door answers when `health().state` is `ready`, and rejects with SearchLoadingError before. */
export function openSearch(settings: SearchSettings): SearchDoor {
  return new Search(settings)
}

class Search implements SearchDoor {
  private thread: SearchThread | null = null
  private ready = false
  private closed = false
  private filled: Filled = { documents: 0, memoryMB: 0 }
  private highestMemoryMB = 0
  private startedFrom: Pick<SearchHealth, 'startedFrom' | 'because'> = {}
  private sequence = 0
  private memoryAskedAt = performance.now()
  private following: Promise<void> | null = null
  private readonly whenReady = new Set<() => void>()
  private readonly whenFurther = new Set<() => void>()
  private readonly timer: NodeJS.Timeout
  private readonly onError: (error: unknown) => void
  private readonly keeper: SnapshotKeeper | null

  constructor(private readonly settings: SearchSettings) {
    this.onError = settings.onError ?? (() => undefined)
    this.keeper = settings.snapshots ? new SnapshotKeeper(settings.database.reader, settings.snapshots, settings.onEvent ?? (() => undefined)) : null
    this.timer = setInterval(() => this.poll(), settings.pollMs ?? 250)
    this.timer.unref()
    void this.keepRunning()
  }

  search = async (request: SearchRequest, whenOrdered?: WhenOrdered): Promise<SearchAnswer> =>
    this.readyThread().call('search', request, callTimeoutMs, whenOrdered)

  similar = async (text: string, filters: SearchFilters, limit: number): Promise<SearchAnswer['hits']> =>
    this.readyThread().call('similar', { text, filters, limit }, callTimeoutMs)

  suggest = async (text: string, limit: number): Promise<{ id: number; title: string }[]> =>
    this.readyThread().call('suggest', { text, limit }, callTimeoutMs)

  explain = async (request: SearchRequest): Promise<SearchExplanation> =>
    this.readyThread().call('explain', request, callTimeoutMs)

  health(): SearchHealth {
    const { latest } = this.keeper ?? {}
    return {
      state: this.ready ? 'ready' : 'loading', documents: this.filled.documents, sequence: this.sequence,
      memoryMB: this.filled.memoryMB, highestMemoryMB: this.highestMemoryMB, ...this.startedFrom, ...(latest ? { snapshot: latest } : {}),
    }
  }

  async catchUp(): Promise<void> {
    const wanted = await currentSequence(this.settings.database.reader)
    const until = performance.now() + longestWaitMs
    while (!this.ready || this.sequence < wanted) {
      // A thread lost on the way is replaced, and the replacement will hold what this one lost.
      // Each step of the run counts, not only its end: while others go on writing it has none.
      if (this.ready) await Promise.race([this.further(), this.follow().catch((error: unknown) => { if (!(error instanceof SearchLoadingError)) throw error })])
      else await this.waitUntilReady(until - performance.now())
    }
  }

  async close(): Promise<void> {
    this.closed = true
    this.ready = false
    clearInterval(this.timer)
    this.wakeWaiting()
    await this.thread?.end(new Error('search was closed'))
    await this.keeper?.abandon()
  }

  private poll(): void {
    const { thread } = this
    if (!this.ready || !thread) return
    this.follow().catch(this.onError)
    this.keeper?.saveWhenDue(thread, this.sequence, this.onError)
    if (performance.now() < this.memoryAskedAt + memoryEveryMs) return
    this.memoryAskedAt = performance.now()
    thread.call('memory', null, callTimeoutMs).then((filled) => this.note(filled), () => undefined)
  }

  /** One thread after the other until closed: each is filled, serves, and is followed by the next when it is lost. */
  private async keepRunning(): Promise<void> {
    for (let pauseMs = 100; !this.closed; pauseMs = Math.min(5_000, pauseMs * 2)) {
      const thread = new SearchThread(this.settings.workerFile)
      this.thread = thread
      try {
        await this.load(thread)
        this.ready = true
        this.wakeWaiting()
        pauseMs = 100
        throw await thread.lost
      } catch (error) {
        this.ready = false
        await thread.end(new Error('the search thread was replaced'))
        if (this.closed) return
        this.onError(error)
      }
      await new Promise((resolve) => setTimeout(resolve, pauseMs).unref())
    }
  }

  /** Fills an empty thread, from a snapshot when there is one to trust, and brings it up to what stands in the log. */
  private async load(thread: SearchThread): Promise<void> {
    const begun = performance.now()
    this.filled = { documents: 0, memoryMB: 0 }
    this.highestMemoryMB = 0
    this.startedFrom = {}
    const restored = await this.keeper?.restore(thread) ?? { because: 'no snapshots are kept' }
    if ('because' in restored) {
      this.startedFrom = { startedFrom: 'tables', because: restored.because }
      await this.build(thread)
    } else {
      this.startedFrom = { startedFrom: 'snapshot' }
      this.sequence = restored.sequence
      this.note(restored.filled)
    }
    const filledAt = this.sequence
    // Up to what stands there now, and no further: while somebody goes on writing the log has no end, and search would stay shut.
    await this.followWith(thread, await currentSequence(this.settings.database.reader))
    this.settings.onEvent?.('ready', {
      ...this.startedFrom, seconds: Math.round((performance.now() - begun) / 100) / 10, documents: this.filled.documents, changes: this.sequence - filledAt, memoryMB: this.filled.memoryMB,
    })
  }

  /** Walks over all entries. The sequence is read first: what is written during the walk is read again from the log. */
  private async build(thread: SearchThread): Promise<void> {
    const { database } = this.settings
    this.sequence = await currentSequence(database.reader)
    const documents = new DocumentReader(database, await readTitles(database.reader))
    let pending: Promise<unknown> = Promise.resolve()
    for (let afterId = 0; ;) {
      const ids = await listVisibleEntryIds(database.reader, afterId, idsARead)
      if (ids.length === 0) break
      afterId = ids.at(-1) ?? afterId
      for await (const { put, remove } of documents.read(ids)) {
        const before = pending
        pending = this.apply(thread, { put, remove, sequence: this.sequence })
        pending.catch(() => undefined)
        // One piece ahead of the thread and no more, or the whole corpus would wait in its mailbox.
        await before
      }
    }
    await pending
  }

  /** Reads the log once to its end; calls that come meanwhile share the run. */
  private follow(): Promise<void> {
    const { thread } = this
    if (!thread) return Promise.reject(new SearchLoadingError())
    this.following ??= this.followWith(thread).finally(() => { this.following = null })
    return this.following
  }

  /** Reads the log to its end, or until `enough` is reached. */
  private async followWith(thread: SearchThread, enough = Infinity): Promise<void> {
    const { database } = this.settings
    while (this.sequence < enough) {
      const { entryIds, reached } = await listChangesAfter(database.reader, this.sequence, changesARead)
      if (reached === this.sequence) return
      const documents = new DocumentReader(database, await readTitles(database.reader))
      for await (const { put, remove, last } of documents.read(entryIds)) {
        await this.apply(thread, { put, remove, sequence: last ? reached : this.sequence })
      }
      this.sequence = reached
      wake(this.whenFurther)
    }
  }

  private further(): Promise<void> {
    return new Promise((resolve) => this.whenFurther.add(resolve))
  }

  private async apply(thread: SearchThread, changes: Changes): Promise<void> {
    this.note(await thread.call('apply', changes, applyTimeoutMs))
  }

  private note(filled: Filled): void {
    this.filled = filled
    this.highestMemoryMB = Math.max(this.highestMemoryMB, filled.memoryMB)
  }

  private readyThread(): SearchThread {
    if (!this.ready || !this.thread) throw new SearchLoadingError()
    return this.thread
  }

  private waitUntilReady(ms: number): Promise<void> {
    if (this.closed || ms <= 0) return Promise.reject(new SearchLoadingError())
    return new Promise((resolve) => {
      const done = () => { clearTimeout(timer); this.whenReady.delete(done); resolve() }
      const timer = setTimeout(done, ms)
      this.whenReady.add(done)
    })
  }

  private wakeWaiting(): void {
    wake(this.whenReady)
  }
}

function wake(waiting: Set<() => void>): void {
  const all = [...waiting]
  waiting.clear()
  for (const done of all) done()
}
