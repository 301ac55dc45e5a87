// The packed lists against MiniSearch, whose scores they give: the oracle is MiniSearch's own BM25 (version 7.2.0).
import fc from 'fast-check'
import MiniSearch from 'minisearch'
import { expect, test } from 'vitest'
import { countTerms } from '@/lib/search/document-terms'
import { Postings } from '@/lib/search/postings'
import { PostingList } from '@/lib/search/posting-list'
import { Question } from '@/lib/search/question'

const bm25 = { k: 1.8, b: 0.7, d: 0 }
const words = ['rivet', 'spar', 'rib', 'flange', 'skin', 'dimple']
const ask = new Question(words.slice(0, 3).map((word) => ({ word, mass: 1, routes: [{ terms: [word], weight: 1, strength: 1 }] })))

test('scores are those of MiniSearch without its coordination factor, whatever was put in and taken out before', () => {
  const text = fc.array(fc.constantFrom(...words), { minLength: 1, maxLength: 12 })
  const change = fc.record({ slot: fc.nat(7), text: fc.option(text) })
  fc.assert(fc.property(fc.array(change, { maxLength: 40 }), (changes) => {
    const postings = new Postings(bm25)
    const now = new Map<number, string[]>()
    for (const { slot, text: terms } of changes) {
      const old = now.get(slot)
      if (old) postings.remove(slot, new Set(old))
      now.delete(slot)
      if (!terms) continue
      postings.add(slot, countTerms(terms))
      now.set(slot, terms)
    }
    const mini = new MiniSearch<{ id: number; terms: string }>({ fields: ['terms'], processTerm: (term) => term, searchOptions: { bm25 } })
    for (const [id, terms] of now) mini.add({ id, terms: terms.join(' ') })
    const expected = new Map(mini.search(ask.terms.join(' ')).map(({ id, score, queryTerms }) => [Number(id), score / queryTerms.length]))
    const held = postings.findHeld(ask, 8)
    const scores = postings.score(ask, held, new Uint8Array(8).fill(1))
    expect([...held.slots].sort()).toEqual([...expected.keys()].sort())
    for (const slot of now.keys()) expect(scores[slot]).toBeCloseTo(expected.get(slot) ?? 0, 9)
    for (const word of words) expect(postings.frequency(word)).toBe([...now.values()].filter((terms) => terms.includes(word)).length)
  }), { numRuns: 200 })
})

test('a list is in order and without repetition, whatever order slots come and go in', () => {
  const step = fc.record({ slot: fc.nat(40), put: fc.boolean(), count: fc.integer({ min: 1, max: 255 }) })
  fc.assert(fc.property(fc.array(step, { maxLength: 150 }), (steps) => {
    const list = new PostingList()
    const expected = new Map<number, number>()
    for (const { slot, put, count } of steps) {
      if (put) list.put(slot, count)
      else list.remove(slot)
      if (put) expected.set(slot, count)
      else expected.delete(slot)
    }
    const found: [number, number][] = []
    list.forEach((slot, count) => found.push([slot, count]))
    expect(found).toEqual([...expected].sort(([a], [b]) => a - b))
  }))
})

test('the last slot a list can hold is held, and the next is refused', () => {
  const list = new PostingList()
  list.put(16_777_215, 300)
  list.forEach((slot, count) => expect([slot, count]).toEqual([16_777_215, 255]))
  expect(() => list.put(16_777_216, 1)).toThrow(RangeError)
})
