import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { analyseText } from '@/lib/domain/search/analyse-text'

const termsOf = (text: string) => analyseText(text).tokens.flatMap((token) => [token.term, ...token.also])
const shared = (a: string, b: string) => termsOf(a).filter((term) => termsOf(b).includes(term))

describe('words', () => {
  test('plurals and forms of a word are one term', () => {
    // Examples of the Porter stemmer's published vocabulary: M. F. Porter, "An algorithm for suffix stripping", Program 14 (1980), step 1.
    expect(termsOf('hopping')).toEqual(termsOf('hop'))
    expect(termsOf('ponies')).toEqual(['poni'])
    expect(termsOf('Rivets riveting riveted')).toEqual(['rivet', 'rivet', 'rivet'])
  })

  test('question words and articles are not searched', () => {
    const { tokens, stopped } = analyseText("How do I deburr the flange, and why wouldn't it wait?")
    expect(tokens.map((token) => token.word)).toEqual(['deburr', 'flange', 'wait'])
    expect(stopped).toContain("wouldn't")
  })

  test('accents, ligatures and capitals do not matter', () => {
    expect(termsOf('ÉLÉVATOR ﬂap')).toEqual(termsOf('elevator flap'))
  })

  test('a hyphened word is found together and apart', () => {
    expect(shared('match-drill', 'matchdrill')).toEqual(['matchdril'])
    expect(shared('match-drill', 'match drill')).toEqual(['match', 'drill'])
    expect(shared('C-frame', 'cframe')).toEqual(['cframe'])
  })
})

describe('numbers and designations', () => {
  test.each([
    ['.032', '0.032'], ['0.1250', '.125'], ['3/8', '.375'], ['1-1/2', '1.5'], ['#30', 'number 30'], ['#30', 'No. 30'],
    ['1,420 lb', '1420 lb'], ['18mm', '18 mm'], ['½', '1/2'],
  ])('%s and %s find one another', (a, b) => {
    expect(shared(a, b)).not.toEqual([])
  })

  test.each([['0.1285', '1285'], ['#30', '30'], ['3/8', '3'], ['.032', '.32']])('%s is not %s', (a, b) => {
    expect(shared(a, b)).toEqual([])
  })

  test('a designation is read the same however it is written', () => {
    expect(termsOf('AN470AD4-6')).toEqual(['an470ad4-6', 'an470ad4', 'an470', 'ad4'])
    expect(termsOf('AN 470 AD 4-6')).toEqual(termsOf('AN470AD4-6'))
    expect(termsOf('an 470 ad 4-6')).toEqual(termsOf('AN470AD4-6'))
    expect(termsOf('AN-470AD4-6')).toEqual(termsOf('AN470AD4-6'))
  })

  test('the article "an" before a number is no designation', () => {
    expect(termsOf('an 8 inch flange')).not.toContain('an8')
  })

  test('a plans reference is one term, its step another', () => {
    expect(termsOf('W3-2 step 6')).toEqual(expect.arrayContaining(['w3-2', 'w3', 'step6']))
    expect(termsOf('W-3')).toEqual(['w3'])
    expect(shared('step 6', 'six steps')).toEqual(['step'])
  })
})

test('any text gives tokens at their places in it, and never an error', () => {
  fc.assert(fc.property(fc.oneof(fc.string({ unit: 'grapheme', maxLength: 300 }), fc.string({ unit: fc.constantFrom(...'aZ9 .,-/#\'’·é½AN470'), maxLength: 300 })), (text) => {
    for (const { term, start, end } of analyseText(text).tokens) {
      expect(term.length).toBeGreaterThan(0)
      expect(term).not.toMatch(/\s|≈/)
      expect(start).toBeGreaterThanOrEqual(0)
      expect(end).toBeGreaterThan(start)
      expect(end).toBeLessThanOrEqual(text.length)
    }
  }))
})
