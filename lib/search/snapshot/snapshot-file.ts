// A snapshot on disk: a header, then numbered pieces, each packed and with a checksum over all of it. What pieces hold is index-snapshot.ts.
// Written under a temporary name, flushed, then renamed: under its own name a file is whole or it is damaged, and damage is found.
import 'server-only'
import { closeSync, fstatSync, openSync, readSync } from 'node:fs'
import { open, rename, rm, type FileHandle } from 'node:fs/promises'
import path from 'node:path'
import { promisify } from 'node:util'
import { constants, crc32, deflateRaw, inflateRawSync } from 'node:zlib'
import { decodeHeader, encodeHeader, headerBytes, snapshotFormat, type SnapshotHeader } from './snapshot-header'

/** The file cannot be used; the message says why, in words for a log. */
export class SnapshotError extends Error {}

/** The packing runs beside the thread that searches; the fastest level, because a slower one saves a tenth of the room. */
const pack = promisify(deflateRaw) as (raw: Buffer, options: object) => Promise<Buffer>
const packing = { level: constants.Z_BEST_SPEED }
/** Number, packed length, length, checksum. */
const frameBytes = 16
const largestPiece = 64 * 1024 * 1024

/** What the writer itself adds to the header. */
export type SealedFacts = Omit<SnapshotHeader, 'format' | 'pieces' | 'bytes'>

export class SnapshotWriter {
  private pieces = 0
  private bytes = headerBytes

  private constructor(private readonly temporary: string, private readonly handle: FileHandle) {}

  /** Begins a file of the name `temporary`; fails when there is one. */
  static async begin(temporary: string): Promise<SnapshotWriter> {
    const handle = await open(temporary, 'wx', 0o600)
    return new SnapshotWriter(temporary, handle)
  }

  async add(raw: Buffer): Promise<void> {
    const packed = await pack(raw, packing)
    const frame = Buffer.alloc(frameBytes)
    frame.writeUInt32LE(this.pieces, 0)
    frame.writeUInt32LE(packed.length, 4)
    frame.writeUInt32LE(raw.length, 8)
    frame.writeUInt32LE(checksum(frame, packed), 12)
    await writeAll(this.handle, Buffer.concat([frame, packed]), this.bytes)
    this.bytes += frameBytes + packed.length
    this.pieces++
  }

  /** Writes the header, makes sure that all of it is on the disk, and gives the file its name. Returns its length. */
  async seal(facts: SealedFacts, file: string): Promise<number> {
    await this.handle.sync()
    const block = encodeHeader({ ...facts, format: snapshotFormat, pieces: this.pieces, bytes: this.bytes })
    await writeAll(this.handle, block, 0)
    await this.handle.sync()
    await this.handle.close()
    await rename(this.temporary, file)
    await syncFolder(path.dirname(file))
    return this.bytes
  }

  async abandon(): Promise<void> {
    await this.handle.close().catch(() => undefined)
    await rm(this.temporary, { force: true })
  }
}

/** The header of `file`. Throws SnapshotError when it cannot be read, is damaged, or is of another format. */
export function readHeader(file: string): SnapshotHeader {
  return withFile(file, headerOf)
}

/** The pieces of `file` in their order. Throws SnapshotError at the first that is not as it was written, and when any is missing. */
export function readPieces(file: string, take: (piece: Buffer) => void): SnapshotHeader {
  return withFile(file, (handle) => {
    const header = headerOf(handle)
    let at = headerBytes
    for (let number = 0; number < header.pieces; number++) {
      const frame = readExactly(handle, at, frameBytes)
      const packed = frame.readUInt32LE(4)
      if (frame.readUInt32LE(0) !== number || packed > largestPiece || frame.readUInt32LE(8) > largestPiece) throw damaged()
      const stored = readExactly(handle, at + frameBytes, packed)
      if (checksum(frame, stored) !== frame.readUInt32LE(12)) throw damaged()
      take(unpack(stored, frame.readUInt32LE(8)))
      at += frameBytes + packed
    }
    if (at !== header.bytes) throw damaged()
    return header
  })
}

function headerOf(handle: number): SnapshotHeader {
  const header = decodeHeader(readExactly(handle, 0, headerBytes))
  if (!header) throw damaged()
  if (header.format !== snapshotFormat) throw new SnapshotError('of another format')
  if (fstatSync(handle).size !== header.bytes) throw damaged()
  return header
}

function unpack(stored: Buffer, length: number): Buffer {
  try {
    // One chunk: texts stay where they are unpacked, so nothing may be kept beside them.
    const raw = inflateRawSync(stored, { maxOutputLength: Math.max(1, length), chunkSize: Math.max(64, length) })
    if (raw.length === length) return raw
  } catch {
    // Told below, like a wrong length.
  }
  throw damaged()
}

function withFile<T>(file: string, read: (handle: number) => T): T {
  let handle: number
  try {
    handle = openSync(file, 'r')
  } catch {
    throw new SnapshotError('not readable')
  }
  try {
    return read(handle)
  } finally {
    closeSync(handle)
  }
}

function readExactly(handle: number, at: number, length: number): Buffer {
  const buffer = Buffer.allocUnsafeSlow(length)
  for (let read = 0; read < length;) {
    const more = readSync(handle, buffer, read, length - read, at + read)
    if (more === 0) throw damaged()
    read += more
  }
  return buffer
}

async function writeAll(handle: FileHandle, bytes: Buffer, at: number): Promise<void> {
  for (let written = 0; written < bytes.length;) written += (await handle.write(bytes, written, bytes.length - written, at + written)).bytesWritten
}

const checksum = (frame: Buffer, packed: Buffer): number => crc32(packed, crc32(frame.subarray(0, frameBytes - 4)))
const damaged = () => new SnapshotError('damaged')

async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r')
  // Some systems refuse to flush a folder; the name is then theirs to keep.
  await handle.sync().catch(() => undefined)
  await handle.close()
}
