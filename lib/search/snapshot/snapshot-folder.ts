// The folder of snapshots: names, which there are, and what may be thrown away. Several processes write here; none touches another's unfinished file.
import 'server-only'
import { randomBytes } from 'node:crypto'
import { mkdirSync, readdirSync, rmSync, statSync } from 'node:fs'
import path from 'node:path'
import { readHeader, SnapshotError } from './snapshot-file'
import type { SnapshotHeader } from './snapshot-header'

/** A file of the folder: its header, or why it cannot be used. */
export type FoundSnapshot = { file: string; header: SnapshotHeader } | { file: string; refused: string }

const name = /^index-(\d+)-[0-9a-f]{12}\.snapshot$/
const temporaryName = /^building-[0-9a-f]{12}\.tmp$/
/** A process that still writes touches its file many times a second. */
const abandonedAfterMs = 3_600_000

export function temporaryFile(folder: string): string {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  return path.join(folder, `building-${randomBytes(6).toString('hex')}.tmp`)
}

/** A name no other process chooses; its number puts the newest last. */
export const snapshotFile = (folder: string, sequence: number): string => path.join(folder, `index-${String(sequence).padStart(15, '0')}-${randomBytes(6).toString('hex')}.snapshot`)

/** What is there, newest first, each with the reason when this thread cannot use it. */
export function listSnapshots(folder: string, thread: string): FoundSnapshot[] {
  return namesIn(folder).filter((each) => name.test(each)).sort().reverse().map((each) => {
    const file = path.join(folder, each)
    try {
      const header = readHeader(file)
      return header.thread === thread ? { file, header } : { file, refused: 'of another version' }
    } catch (error) {
      // Whatever the disk says: the index can be made without it.
      return { file, refused: error instanceof SnapshotError ? error.message : 'not readable' }
    }
  })
}

/** Removes snapshots that `kept` has overtaken, and what killed processes left. The order of names is the same for all, so the last one stands whoever tidies. */
export function tidyFolder(folder: string, kept: string): void {
  for (const each of namesIn(folder)) {
    const isOvertaken = name.test(each) && each < path.basename(kept)
    if (isOvertaken || (temporaryName.test(each) && isAbandoned(path.join(folder, each)))) rmSync(path.join(folder, each), { force: true })
  }
}

function isAbandoned(file: string): boolean {
  const found = statSync(file, { throwIfNoEntry: false })
  return found !== undefined && found.mtimeMs < Date.now() - abandonedAfterMs
}

function namesIn(folder: string): string[] {
  try {
    return readdirSync(folder)
  } catch {
    // Not made yet.
    return []
  }
}
