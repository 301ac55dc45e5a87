// The first block of a snapshot: what it was made of and how far, in a fixed room that is written last. What follows it is snapshot-file.ts.
import 'server-only'
import { crc32 } from 'node:zlib'

/** Where a history stood: a row of the audit chain. `hash` is empty and `sequence` 0 while nothing was recorded. */
export interface AuditAnchor { sequence: number; hash: string }

export interface SnapshotHeader {
  format: number
  /** Of the code that read texts into terms: the hash of the search thread's own file. */
  thread: string
  /** Identity of the database, given when it was first migrated. */
  database: string
  /** Hash of what documents are made of beside the log: titles of kits, sections and operations, and the code that makes them. */
  material: string
  /** Sequence of the change log that is surely in it; entries may be newer. */
  sequence: number
  /** Sequence at its end: a database that has not come so far is an older copy. */
  reached: number
  anchor: AuditAnchor
  documents: number
  pieces: number
  /** Length of the whole file. */
  bytes: number
  /** UTC milliseconds. */
  savedAt: number
}

/** Counts up when the layout of the file changes. */
export const snapshotFormat = 1
export const headerBytes = 1024
const mark = 'PILOTHOLE SEARCH SNAPSHOT\n'
const checkBytes = 4

/** Throws RangeError when the facts do not fit into the block. */
export function encodeHeader(header: SnapshotHeader): Buffer {
  const text = Buffer.from(mark + JSON.stringify(header))
  if (text.length > headerBytes - checkBytes) throw new RangeError('the header of the snapshot is too long')
  const block = Buffer.alloc(headerBytes, ' ')
  text.copy(block)
  block.writeUInt32LE(crc32(block.subarray(0, headerBytes - checkBytes)), headerBytes - checkBytes)
  return block
}

/** The header, or null when a byte of the block is not as it was written. */
export function decodeHeader(block: Buffer): SnapshotHeader | null {
  if (block.length !== headerBytes || !block.subarray(0, mark.length).equals(Buffer.from(mark))) return null
  if (crc32(block.subarray(0, headerBytes - checkBytes)) !== block.readUInt32LE(headerBytes - checkBytes)) return null
  // Checked above to be what encodeHeader wrote, so it has its shape unless its format is another.
  return JSON.parse(block.subarray(mark.length, headerBytes - checkBytes).toString()) as SnapshotHeader
}
