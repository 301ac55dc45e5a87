// The index as pieces of a snapshot and back: entries with their terms, their texts, and the words of the corpus.
// Entries are written while others are put in and taken out. Each is whole, and what changed meanwhile is read again from the change log.
import 'server-only'
import { shareLists, type PackedDocument } from '../packed-document'
import type { PostingList } from '../posting-list'
import type { IndexRecord, SearchIndex } from '../search-index'
import { decodeNumbers, NumberWriter } from './packed-numbers'
import { readPieces, SnapshotError, type SnapshotWriter } from './snapshot-file'
import type { SnapshotHeader } from './snapshot-header'

type StoredEntry = Omit<PackedDocument, 'texts'> & { bytes: number; terms: number }
/** `terms`: those that no piece before named; they are numbered in the order in which they come. */
interface EntriesPiece { kind: 'entries'; entries: StoredEntry[]; terms: string[] }
interface WordsPiece { kind: 'words'; words: [string, number][] }

/** A question waits for no more than this while a snapshot is saved. */
const stepMs = 4
const textBytesAPiece = 192 * 1024
const entriesAPiece = 256
const wordsAPiece = 4_000

/** Writes all of `index` in small steps; returns how many entries were written. `pause` is awaited between two steps. */
export async function writeIndex(index: SearchIndex, writer: SnapshotWriter, pause: () => Promise<void>): Promise<number> {
  const batch = new Batch()
  let written = 0
  let until = performance.now() + stepMs
  for (const id of index.ids()) {
    // Gone meanwhile; the log tells.
    const record = index.record(id)
    if (record) {
      batch.add(record)
      written++
    }
    if (batch.isFull()) for (const piece of batch.take()) await writer.add(piece)
    if (performance.now() < until) continue
    await pause()
    until = performance.now() + stepMs
  }
  for (const piece of batch.take()) await writer.add(piece)
  const words = [...batch.words]
  for (let start = 0; start < words.length; start += wordsAPiece) {
    await writer.add(joined({ kind: 'words', words: words.slice(start, start + wordsAPiece) }))
    await pause()
  }
  return written
}

/** Fills an empty `index` from `file`. Throws SnapshotError when the file is not whole; the index is worth nothing then. */
export function readIndex(index: SearchIndex, file: string): SnapshotHeader {
  const lists: PostingList[] = []
  let waiting: { piece: EntriesPiece; numbers: number[] } | null = null
  const header = readPieces(file, (raw) => {
    if (waiting) {
      restoreEntries(index, waiting.piece, waiting.numbers, raw, lists)
      waiting = null
      return
    }
    const { piece, rest } = parted(raw)
    if (piece.kind === 'words') for (const [word, documents] of piece.words) index.restoreWord(word, documents)
    else {
      for (const term of piece.terms) lists.push(index.listOf(term))
      waiting = { piece, numbers: decodeNumbers(rest) }
    }
  })
  if (waiting || index.documents !== header.documents) throw new SnapshotError('damaged')
  return header
}

/** Entries that wait to become two pieces: their facts and terms, and their texts, which stay in memory as they are read. */
class Batch {
  readonly words = new Map<string, number>()
  private readonly numberOf = new Map<string, number>()
  private entries: StoredEntry[] = []
  private newTerms: string[] = []
  private texts: Uint8Array[] = []
  private textBytes = 0
  private numbers = new NumberWriter()

  add({ document: { texts, ...document }, terms, words }: IndexRecord): void {
    this.entries.push({ ...document, bytes: texts.length, terms: terms.size })
    this.texts.push(texts)
    this.textBytes += texts.length
    for (const [term, count] of terms) {
      this.numbers.write(this.number(term))
      this.numbers.write(count)
    }
    for (const word of words) this.words.set(word, (this.words.get(word) ?? 0) + 1)
  }

  isFull(): boolean {
    return this.textBytes >= textBytesAPiece || this.entries.length >= entriesAPiece
  }

  take(): Buffer[] {
    if (this.entries.length === 0) return []
    const pieces = [joined({ kind: 'entries', entries: this.entries, terms: this.newTerms }, this.numbers.take()), Buffer.concat(this.texts)]
    this.entries = []
    this.newTerms = []
    this.texts = []
    this.textBytes = 0
    return pieces
  }

  private number(term: string): number {
    const known = this.numberOf.get(term)
    if (known !== undefined) return known
    this.newTerms.push(term)
    this.numberOf.set(term, this.numberOf.size)
    return this.numberOf.size - 1
  }
}

function restoreEntries(index: SearchIndex, { entries }: EntriesPiece, numbers: readonly number[], texts: Buffer, lists: readonly PostingList[]): void {
  let [atText, atNumber] = [0, 0]
  for (const { bytes, terms, ...document } of entries) {
    const held: [PostingList, number][] = []
    for (let i = 0; i < terms; i++, atNumber += 2) {
      const list = lists[numbers[atNumber] ?? -1]
      if (!list) throw new SnapshotError('damaged')
      held.push([list, numbers[atNumber + 1] ?? 1])
    }
    index.restore(shareLists({ ...document, texts: texts.subarray(atText, atText + bytes) }), held)
    atText += bytes
  }
  if (atText !== texts.length || atNumber !== numbers.length) throw new SnapshotError('damaged')
}

/** Length of the JSON, the JSON, then the numbers. */
function joined(piece: EntriesPiece | WordsPiece, numbers: Buffer = Buffer.alloc(0)): Buffer {
  const json = Buffer.from(JSON.stringify(piece))
  const length = Buffer.alloc(4)
  length.writeUInt32LE(json.length)
  return Buffer.concat([length, json, numbers])
}

function parted(raw: Buffer): { piece: EntriesPiece | WordsPiece; rest: Buffer } {
  const end = 4 + raw.readUInt32LE(0)
  // Its checksum says that this version wrote it, so it has this shape.
  return { piece: JSON.parse(raw.subarray(4, end).toString()) as EntriesPiece | WordsPiece, rest: raw.subarray(end) }
}
