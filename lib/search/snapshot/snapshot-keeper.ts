// The main thread's side of snapshots: which one a thread may start from, when the next is due, and what became of it.
// Reading and writing them is the search thread's own work (snapshot-saver.ts, index-snapshot.ts).
import 'server-only'
import { rm } from 'node:fs/promises'
import type { Reader } from '@/db/client'
import { SearchLoadingError, type SearchHealth } from '../messages'
import type { SearchThread } from '../search-thread'
import type { Filled } from '../worker-messages'
import { hashOfMaterial, readFacts, refusalOf } from './database-facts'
import { temporaryFile } from './snapshot-folder'

export interface SnapshotSettings {
  folder: string
  /** Saved when this many changes came since the last one … */
  changes?: number
  /** … but not sooner after it than this, in milliseconds. */
  restMs?: number
  /** Saved after this time when anything changed at all. */
  longestMs?: number
}

export type Tell = (event: string, facts: Record<string, string | number | boolean>) => void
/** What the thread holds now; `because` when that is nothing. */
export type Restored = { filled: Filled; sequence: number } | { because: string }

const listTimeoutMs = 30_000
const loadTimeoutMs = 120_000
const writeTimeoutMs = 900_000
const sealTimeoutMs = 60_000

export class SnapshotKeeper {
  latest: SearchHealth['snapshot']
  private readonly changes: number
  private readonly restMs: number
  private readonly longestMs: number
  private saving: Promise<void> | null = null
  private temporary: string | null = null
  /** Begun and not ended: a file that ends its thread is not tried again. */
  private trying: string | null = null
  private notBefore = 0
  /** Read before any document of the index was: titles that change while it lives are in some documents and not in others. */
  private material = ''

  constructor(private readonly reader: Reader, private readonly settings: SnapshotSettings, private readonly tell: Tell) {
    this.changes = settings.changes ?? 2_000
    this.restMs = settings.restMs ?? 120_000
    this.longestMs = settings.longestMs ?? 900_000
  }

  /** Loads the newest snapshot that is whole and of this database into `thread`; those that are not are removed. */
  async restore(thread: SearchThread): Promise<Restored> {
    this.material = await hashOfMaterial(this.reader)
    let because = 'there is no snapshot'
    for (const found of await thread.call('listSnapshots', { folder: this.settings.folder }, listTimeoutMs)) {
      const refused = 'refused' in found ? found.refused : await refusalOf(found.header, this.material, this.reader)
      const loaded = refused === null && 'header' in found ? await this.load(thread, found.file) : { refused: refused ?? '' }
      if ('header' in found && !('refused' in loaded)) {
        const { sequence, savedAt, bytes } = found.header
        this.latest = { sequence, savedAt, MB: roundMB(bytes) }
        return { filled: loaded, sequence }
      }
      because = `the snapshot is ${'refused' in loaded ? loaded.refused : 'gone'}`
      this.tell('snapshot-refused', { because })
      // One that cannot be removed is refused again the next time.
      await rm(found.file, { force: true }).catch(() => undefined)
    }
    return { because }
  }

  /** Begins to save when it is time to. Never throws; returns at once. */
  saveWhenDue(thread: SearchThread, sequence: number, onError: (error: unknown) => void): void {
    if (this.saving || !this.isDue(sequence)) return
    this.saving = this.save(thread, sequence).catch((error: unknown) => {
      this.notBefore = Date.now() + this.restMs
      // A thread that ended has been told already.
      if (!(error instanceof SearchLoadingError)) onError(error)
    }).finally(() => { this.saving = null })
  }

  /** Removes what is half written; for when the thread has ended. */
  async abandon(): Promise<void> {
    await this.saving
    if (this.temporary) await rm(this.temporary, { force: true })
  }

  private async load(thread: SearchThread, file: string): Promise<Filled | { refused: string }> {
    if (this.trying === file) return { refused: 'one that ended the search thread' }
    this.trying = file
    const loaded = await thread.call('loadSnapshot', { file }, loadTimeoutMs)
    this.trying = null
    return loaded
  }

  private isDue(sequence: number): boolean {
    const now = Date.now()
    if (now < this.notBefore) return false
    if (!this.latest) return true
    const since = now - this.latest.savedAt
    const changes = sequence - this.latest.sequence
    return (changes >= this.changes && since >= this.restMs) || (changes > 0 && since >= this.longestMs)
  }

  private async save(thread: SearchThread, sequence: number): Promise<void> {
    const { folder } = this.settings
    this.temporary = temporaryFile(folder)
    const written = await thread.call('writeSnapshot', { temporary: this.temporary }, writeTimeoutMs)
    const savedAt = Date.now()
    const facts = { ...await readFacts(this.reader), material: this.material, sequence, savedAt }
    const { MB } = await thread.call('sealSnapshot', { facts, folder }, sealTimeoutMs)
    this.temporary = null
    this.latest = { sequence, savedAt, MB: roundMB(MB * 1e6), seconds: Math.round(written.ms / 100) / 10, highestMemoryMB: written.memoryMB }
    this.tell('snapshot-saved', { documents: written.documents, ...this.latest })
  }
}

const roundMB = (bytes: number): number => Math.round(bytes / 1e5) / 10
