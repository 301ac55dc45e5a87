import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { editDistance } from '@/lib/domain/search/edit-distance'
import { findMeantWords, splitCompound } from '@/lib/domain/search/find-meant-words'
import { Vocabulary } from '@/lib/domain/search/vocabulary'

function vocabularyOf(words: string): Vocabulary {
  const vocabulary = new Vocabulary()
  for (const word of words.split(' ')) vocabulary.add(word)
  return vocabulary
}
const trade = vocabularyOf('grommet twist longeron exhaust exhaust baggage springs lock spark plug countersink rivet river nut plate gasket')
const meant = (word: string) => findMeantWords(word, trade)[0]?.word

describe('edit distance', () => {
  test.each([
    // kitten/sitting is the textbook pair of Levenshtein's distance (R. A. Wagner and M. J. Fischer's algorithm): 3.
    ['kitten', 'sitting', 3],
    // Optimal string alignment gives 3 for CA and ABC, where unrestricted Damerau-Levenshtein gives 2 (L. Boytsov, JEA 16, 2011).
    ['ca', 'abc', 3],
    ['twsit', 'twist', 1], ['', 'abc', 3], ['same', 'same', 0],
  ])('%s to %s is %i', (a, b, distance) => {
    expect(editDistance(a, b, 9)).toBe(distance)
  })

  test('is symmetric, and a limit only cuts it off', () => {
    const word = fc.string({ unit: fc.constantFrom(...'abcd'), maxLength: 8 })
    fc.assert(fc.property(word, word, fc.integer({ min: 0, max: 4 }), (a, b, limit) => {
      expect(editDistance(a, b, 9)).toBe(editDistance(b, a, 9))
      expect(editDistance(a, b, limit)).toBe(Math.min(limit + 1, editDistance(a, b, 9)))
    }))
  })
})

describe('a word that no entry holds', () => {
  test.each([
    ['gromet', 'grommet', 'a letter left out'], ['exhausst', 'exhaust', 'a letter doubled'], ['twsit', 'twist', 'two letters changed round'],
    ['longerom', 'longeron', 'a wrong letter'], ['xrommet', 'grommet', 'a wrong first letter'], ['gromit', 'grommet', 'two slips in a longer word'],
    ['lok', 'lock', 'one slip in a short word'],
  ])('%s means %s (%s)', (typed, right) => {
    expect(meant(typed)).toBe(right)
  })

  test('means nothing when nothing is near', () => {
    expect(meant('transponder')).toBeUndefined()
    expect(meant('zok')).toBeUndefined()
  })

  test('is taken apart where entries hold both halves', () => {
    expect(splitCompound('sparkplug', trade)).toEqual(['spark', 'plug'])
    expect(splitCompound('nutplate', trade)).toEqual(['nut', 'plate'])
    expect(splitCompound('grommet', trade)).toBeNull()
  })

  test('is no longer suggested once the last entry with it is gone', () => {
    const vocabulary = vocabularyOf('flange')
    expect(findMeantWords('flangge', vocabulary)).toHaveLength(1)
    vocabulary.remove('flange')
    expect(findMeantWords('flangge', vocabulary)).toHaveLength(0)
    expect(vocabulary.startingWith('fla', 5)).toHaveLength(0)
  })

  test('is found by its letters exactly as by comparing with every word', () => {
    const word = fc.string({ unit: fc.constantFrom(...'abcdé9'), minLength: 1, maxLength: 7 })
    fc.assert(fc.property(fc.array(word, { maxLength: 20 }), word, fc.constantFrom(1, 2), (words, typed, limit) => {
      const vocabulary = new Vocabulary()
      for (const each of words) vocabulary.add(each)
      const expected = [...new Set(words)].filter((each) => editDistance(typed, each, limit) <= limit).sort()
      expect(vocabulary.near(typed, limit, 100).map((candidate) => candidate.word).sort()).toEqual(expected)
    }))
  })
})
