import { describe, expect, test } from 'vitest'
import { analyseText } from '@/lib/domain/search/analyse-text'
import { Synonyms } from '@/lib/domain/search/synonyms'

const synonyms = new Synonyms({
  twoWay: [['nut plate', 'nutplate', 'anchor nut'], ['drill', 'drill bit'], ['drill stop', 'depth stop'], ['rivet', 'rivets'], ['to follow', 'back order']],
  oneWay: [{ from: 'ear muffs', to: ['hearing protection'] }, { from: 'k1000', to: ['nut plate'] }],
})
const inText = (text: string) => new Set(synonyms.labelText(analyseText(text).tokens).flatMap((match) => match.terms))
const inQuery = (text: string) => new Set(synonyms.widenQuery(analyseText(text).tokens).flatMap((match) => match.terms))
const finds = (query: string, text: string) => [...inQuery(query)].some((term) => inText(text).has(term))

describe('synonyms', () => {
  test('a phrase finds a word and a word a phrase, both ways', () => {
    expect(finds('nutplate', 'an anchor nut behind the panel')).toBe(true)
    expect(finds('anchor nuts', 'Nutplates came loose')).toBe(true)
  })

  test('a phrase counts only where its words stand together', () => {
    expect(finds('nutplate', 'the nut left the plate and the anchor')).toBe(false)
  })

  test('one-way synonyms never find backwards', () => {
    expect(finds('ear muffs', 'wear hearing protection')).toBe(true)
    expect(finds('hearing protection', 'my ear muffs broke')).toBe(false)
  })

  test('a one-way synonym reaches the whole group it names', () => {
    expect(finds('K1000', 'anchor nuts')).toBe(true)
  })

  test('in a longer phrase the shorter one is not widened by itself', () => {
    expect(finds('drill stop', 'set the depth stop')).toBe(true)
    expect(finds('drill stop', 'a new drill bit')).toBe(false)
  })

  test('a phrase that loses its words to the stop list is left out: "follow" alone is no back order', () => {
    expect(finds('follow', 'the part is on back order')).toBe(false)
  })

  test('forms of one word need no group', () => {
    expect(inText('rivets').size).toBe(0)
  })
})
