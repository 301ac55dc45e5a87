// A snapshot gives back the index it was made of, or is refused.
import { mkdtempSync, readdirSync, readFileSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import type { SearchDocument } from '@/lib/search/messages'
import { packDocument, unpackDocument } from '@/lib/search/packed-document'
import type { SearchIndex } from '@/lib/search/search-index'
import { readIndex, writeIndex } from '@/lib/search/snapshot/index-snapshot'
import { readHeader, SnapshotError, SnapshotWriter } from '@/lib/search/snapshot/snapshot-file'
import { listSnapshots, snapshotFile, temporaryFile, tidyFolder } from '@/lib/search/snapshot/snapshot-folder'
import { decodeHeader, encodeHeader, type SnapshotHeader } from '@/lib/search/snapshot/snapshot-header'
import { aDocument, ask, indexOf } from './corpus'

let folder: string
beforeAll(() => { folder = mkdtempSync(path.join(os.tmpdir(), 'pilothole-snapshot-')) })
afterAll(() => rmSync(folder, { recursive: true, force: true }))

const facts = { thread: 'this', database: 'd', material: 'm', sequence: 7, reached: 9, anchor: { sequence: 3, hash: 'h' }, savedAt: 1 }
const nothing = () => Promise.resolve()

async function save(index: SearchIndex, pause = nothing, into = folder): Promise<string> {
  const writer = await SnapshotWriter.begin(temporaryFile(into))
  const documents = await writeIndex(index, writer, pause)
  const file = snapshotFile(into, facts.sequence)
  await writer.seal({ ...facts, documents }, file)
  return file
}

function load(file: string): SearchIndex {
  const index = indexOf()
  readIndex(index, file)
  return index
}

const words = ['rivet', 'spar', 'rib', 'flange', 'skin', 'dimple', 'prime', 'torque', 'grommet', 'nut plate', '#30', '3/16 in', 'entgraten–später', '½″ drill', '✈ prop']
const document = fc.record({
  id: fc.integer({ min: 1, max: 12 }), title: fc.array(fc.constantFrom(...words), { maxLength: 3 }).map((list) => list.join(' ')),
  texts: fc.array(fc.array(fc.constantFrom(...words), { maxLength: 6 }).map((list) => list.join(' ')), { minLength: 1, maxLength: 3 }), kit: fc.constantFrom('whimbrel-2', 'ouzel-3'), stamped: fc.boolean(),
}).map(({ id, title, texts, kit, stamped }): SearchDocument =>
  aDocument({ id, title, kit, stamped, labels: `W-3\n${title}`, passages: texts.map((text, i) => ({ postId: id * 10 + i, text, weight: 1 + i / 10 })) }))
const change = fc.oneof({ weight: 4, arbitrary: document.map((put) => ({ put })) }, fc.integer({ min: 1, max: 12 }).map((remove) => ({ remove })))

function apply(index: SearchIndex, changes: readonly ({ put: SearchDocument } | { remove: number })[]): void {
  for (const each of changes) {
    if ('put' in each) index.put(each.put)
    else index.remove(each.remove)
  }
}

function isRefused(bytes: Buffer): boolean {
  const file = path.join(folder, 'broken')
  writeFileSync(file, bytes)
  try {
    load(file)
    return false
  } catch (error) {
    if (error instanceof SnapshotError) return true
    throw error
  }
}

/** All that anybody can ask of an index. */
function answers(index: SearchIndex) {
  return {
    documents: index.documents,
    found: [...words, 'rib spar', 'gromet', 'dimpl', 'rubber bush', 'ri'].map((text) => {
      const { hits, ...rest } = ask(index, text)
      return { text, ...rest, hits: hits.map((hit) => ({ ...hit, score: hit.score.toFixed(9) })) }
    }),
    filtered: ask(index, 'rib', { kit: 'ouzel-3', stamped: true }).hits.map(({ id }) => id),
    similar: index.similar('a rivet in the flange of a rib', {}, 5).map(({ id, postId, score }) => ({ id, postId, score: score.toFixed(9) })),
    suggested: ['ri', 'nut pl', 'flange'].map((text) => index.suggest(text, 5_000).map(({ id, title }) => `${id} ${title}`).sort()),
  }
}

describe('round trip', () => {
  test('an index from a snapshot, changed further, answers like one made anew', async () => {
    await fc.assert(fc.asyncProperty(fc.array(change, { maxLength: 25 }), fc.array(change, { maxLength: 12 }), async (before, after) => {
      const original = indexOf()
      apply(original, before)
      const loaded = load(await save(original))
      apply(loaded, after)
      const last = new Map<number, SearchDocument>()
      for (const each of [...before, ...after]) {
        if ('put' in each) last.set(each.put.id, each.put)
        else last.delete(each.remove)
      }
      expect(answers(loaded)).toEqual(answers(indexOf(...last.values())))
    }), { numRuns: 40 })
  })

  test('changes that come while it is saved, and again from the log afterwards, leave no trace of having come twice', async () => {
    const many = Array.from({ length: 900 }, (_, i) => aDocument({ id: i + 1, title: `Rib ${i}` }, 'rivet spar flange '.repeat(20)))
    const index = indexOf(...many)
    const changes = [{ put: aDocument({ id: 3, title: 'Torque' }, 'torque') }, { remove: 899 }, { remove: 2 }, { put: aDocument({ id: 2_000, title: 'Dimple' }, 'dimple') }]
    let pauses = 0
    const file = await save(index, () => { if (pauses++ === 0) apply(index, changes); return Promise.resolve() })
    expect(pauses).toBeGreaterThan(1)
    const loaded = load(file)
    apply(loaded, changes)
    const anew = indexOf(...many)
    apply(anew, changes)
    expect(answers(loaded)).toEqual(answers(anew))
  })

  test('a text comes back as it was, in every script', () => {
    fc.assert(fc.property(fc.array(fc.string({ unit: 'grapheme', maxLength: 30 }), { minLength: 1, maxLength: 4 }), fc.string({ unit: 'grapheme' }), (texts, labels) => {
      const whole = aDocument({ id: 1, labels, passages: texts.map((text, i) => ({ postId: i, text, weight: 1 })) })
      expect(unpackDocument(packDocument(whole))).toEqual(whole)
    }))
  })
})

describe('refused', () => {
  let file: string
  let bytes: Buffer
  beforeAll(async () => {
    file = await save(indexOf(aDocument({ id: 1, title: 'Rib' }, 'rivet spar'), aDocument({ id: 2, title: 'Spar' }, 'dimple')))
    bytes = readFileSync(file)
  })

  test('whichever byte is another', () => {
    expect(load(file).documents).toBe(2)
    expect(Array.from(bytes.keys()).filter((at) => {
      const copy = Buffer.from(bytes)
      copy[at] = (copy[at] ?? 0) ^ (1 << (at % 8))
      return !isRefused(copy)
    })).toEqual([])
  }, 40_000)

  test('wherever it is cut off, and when something was appended', () => {
    expect(Array.from(bytes.keys()).filter((length) => length % 5 === 0 && !isRefused(bytes.subarray(0, length)))).toEqual([])
    expect(isRefused(Buffer.concat([bytes, Buffer.of(0)]))).toBe(true)
  }, 40_000)

  test('of another format', () => {
    const header: SnapshotHeader = { ...readHeader(file), format: 2 }
    const other = path.join(folder, 'other')
    writeFileSync(other, Buffer.concat([encodeHeader(header), bytes.subarray(1024)]))
    expect(() => readHeader(other)).toThrow('of another format')
    expect(decodeHeader(encodeHeader(header))).toEqual(header)
  })

  test('of another version of the thread, with the reason; the newest comes first', async () => {
    const own = mkdtempSync(path.join(folder, 'own-'))
    const first = await save(indexOf(), nothing, own)
    expect(listSnapshots(own, 'this')).toMatchObject([{ file: first, header: facts }])
    expect(listSnapshots(own, 'that')).toEqual([{ file: first, refused: 'of another version' }])
    const later = path.join(own, path.basename(snapshotFile(own, 10_000)))
    writeFileSync(later, 'no snapshot')
    expect(listSnapshots(own, 'this').map((found) => found.file)).toEqual([later, first])
    expect(listSnapshots(own, 'this')[0]).toMatchObject({ refused: 'damaged' })
  })
})

describe('the folder', () => {
  test('what was begun and never ended is no snapshot, and is removed when nobody can be writing it any more', async () => {
    const own = mkdtempSync(path.join(folder, 'own-'))
    const [fresh, left] = [temporaryFile(own), temporaryFile(own)]
    for (const each of [fresh, left]) await SnapshotWriter.begin(each).then((writer) => writer.add(Buffer.from('half')))
    const twoHoursAgo = Date.now() / 1000 - 7_200
    utimesSync(left, twoHoursAgo, twoHoursAgo)
    expect(listSnapshots(own, 'this')).toEqual([])
    tidyFolder(own, snapshotFile(own, 1))
    expect(readdirSync(own)).toEqual([path.basename(fresh)])
  })

  test('of several processes that tidy, the newest snapshot stands', async () => {
    const own = mkdtempSync(path.join(folder, 'own-'))
    const both = [await save(indexOf(), nothing, own), await save(indexOf(), nothing, own)].sort()
    for (const mine of both) tidyFolder(own, mine)
    expect(readdirSync(own)).toEqual([path.basename(both[1] ?? '')])
  })

  test('an unfinished file is taken away when saving is given up', async () => {
    const own = mkdtempSync(path.join(folder, 'own-'))
    const writer = await SnapshotWriter.begin(temporaryFile(own))
    await writer.add(Buffer.from('half'))
    await writer.abandon()
    expect(readdirSync(own)).toEqual([])
  })
})
