import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { makeSnippet } from '@/lib/domain/search/snippet'

/** A surrogate without its other half. */
const halfCharacter = /\p{Cs}/u

const marked = (plain: string, terms: string[], maxLength?: number) => {
  const { snippet, marks } = makeSnippet(plain, terms, maxLength)
  return marks.map(([start, end]) => snippet.slice(start, end))
}

describe('snippet', () => {
  test('a short text comes whole, with every match marked, in any case', () => {
    expect(makeSnippet('Deburr the grommet hole. A Grommet chafes.', ['grommet'])).toEqual({
      snippet: 'Deburr the grommet hole. A Grommet chafes.', marks: [[11, 18], [27, 34]],
    })
  })

  test('only whole words are marked, and phrases as one', () => {
    expect(marked('the nut plate, a plateau and a nut', ['plate', 'nut plate', 'nut'])).toEqual(['nut plate', 'nut'])
  })

  test('numbers and signs are marked as written', () => {
    expect(marked('use a #30 or 0.1285 in, not 0.12850', ['#30', '0.1285'])).toEqual(['#30', '0.1285'])
  })

  test('of a long text the window with the most different words is shown, between whole words', () => {
    const text = `${'lorem ipsum '.repeat(40)}the flange is fluted before the rib is primed ${'dolor sit '.repeat(40)}`
    const { snippet, marks } = makeSnippet(text, ['flange', 'primed', 'lorem'], 100)
    expect(snippet.length).toBeLessThanOrEqual(100)
    expect(snippet).toMatch(/^…\S.*\S…$/)
    expect(marks.map(([s, e]) => snippet.slice(s, e))).toEqual(expect.arrayContaining(['flange', 'primed']))
    for (const word of snippet.replaceAll('…', '').split(' ')) expect(text.split(' ')).toContain(word)
  })

  test('without a match the beginning is shown', () => {
    const { snippet, marks } = makeSnippet('first words '.repeat(50), ['absent'], 60)
    expect(snippet).toMatch(/^first words .*…$/)
    expect(marks).toEqual([])
  })

  test('holds for any text: within the length, marks ascend inside it and show a term, no half characters', () => {
    const text = fc.oneof(fc.string({ unit: 'grapheme', maxLength: 600 }), fc.string({ unit: fc.constantFrom('a', 'b', ' ', '-', '😀', 'é', '.'), maxLength: 600 }))
    const term = fc.oneof(fc.string({ unit: fc.constantFrom('a', 'b', '😀', 'é', '.', '(', '\\', '-'), maxLength: 4 }), fc.string({ unit: 'grapheme', maxLength: 5 }))
    fc.assert(fc.property(text, fc.array(term, { maxLength: 6 }), fc.integer({ min: 20, max: 300 }), (plain, terms, maxLength) => {
      const { snippet, marks } = makeSnippet(plain, terms, maxLength)
      expect(snippet.length).toBeLessThanOrEqual(maxLength)
      if (!halfCharacter.test(plain)) expect(snippet).not.toMatch(halfCharacter)
      let last = 0
      const wanted = terms.map((t) => t.replace(/\s+/gu, ' ').trim().toLowerCase())
      for (const [start, end] of marks) {
        expect(start).toBeGreaterThanOrEqual(last)
        expect(end).toBeGreaterThan(start)
        expect(end).toBeLessThanOrEqual(snippet.length)
        expect(wanted).toContain(snippet.slice(start, end).toLowerCase())
        last = end
      }
    }), { numRuns: 500 })
  })

  test('many terms in a long text are marked in little time', () => {
    const text = 'rivet the spar web and dimple the skin '.repeat(600)
    const begun = performance.now()
    makeSnippet(text, Array.from({ length: 100 }, (_, i) => `term${i}`).concat('rivet', 'skin'))
    expect(performance.now() - begun).toBeLessThan(500)
  })
})
