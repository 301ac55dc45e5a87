// Saving one snapshot in the search thread, in two steps: the pieces, then, once the database was asked how far it has come, the header and the name.
import 'server-only'
import { statSync } from 'node:fs'
import path from 'node:path'
import type { SearchIndex } from '../search-index'
import { threadMemoryMB } from '../thread-memory'
import { writeIndex } from './index-snapshot'
import { SnapshotWriter, type SealedFacts } from './snapshot-file'
import { snapshotFile, tidyFolder } from './snapshot-folder'

/** Between two steps: nobody waits for a snapshot, and the processor is also the main thread's. */
const restMs = 3

/** What the door knows and the thread does not. */
export type FactsOfDatabase = Omit<SealedFacts, 'thread' | 'documents'>
/** `memoryMB`: the most the thread had while it wrote. */
export interface WrittenPieces { documents: number; ms: number; memoryMB: number }

export class SnapshotSaver {
  private unsealed: { writer: SnapshotWriter; documents: number } | null = null

  constructor(private readonly thread: string) {}

  /** Writes the pieces of `index` into `temporary`. One at a time: what an earlier call left unsealed is thrown away. */
  async write(index: SearchIndex, temporary: string): Promise<WrittenPieces> {
    await this.unsealed?.writer.abandon()
    this.unsealed = null
    const begun = performance.now()
    let memoryMB = threadMemoryMB()
    const writer = await SnapshotWriter.begin(temporary)
    try {
      const documents = await writeIndex(index, writer, async () => {
        memoryMB = Math.max(memoryMB, threadMemoryMB())
        await new Promise((resolve) => setTimeout(resolve, restMs))
      })
      this.unsealed = { writer, documents }
      return { documents, ms: performance.now() - begun, memoryMB }
    } catch (error) {
      await writer.abandon()
      throw error
    }
  }

  /** Gives the written pieces their header and their name in the folder, and removes what they overtake. Returns megabytes. */
  async seal(facts: FactsOfDatabase, folder: string): Promise<number> {
    const { unsealed } = this
    if (!unsealed) throw new Error('no snapshot was written')
    this.unsealed = null
    const file = snapshotFile(folder, facts.sequence)
    try {
      await unsealed.writer.seal({ ...facts, thread: this.thread, documents: unsealed.documents }, file)
    } catch (error) {
      await unsealed.writer.abandon()
      throw error
    }
    tidyFolder(path.dirname(file), file)
    return statSync(file).size / 1e6
  }
}
