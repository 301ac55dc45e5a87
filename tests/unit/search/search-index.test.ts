import fc from 'fast-check'
import { beforeAll, describe, expect, test } from 'vitest'
import { SearchIndex } from '@/lib/search/search-index'
import { aDocument, ask, idsFor, indexOf } from './corpus'

const filler = Array.from({ length: 12 }, (_, i) => aDocument({ id: 100 + i, title: `Paint booth diary ${i}` }, 'Overspray settled on the bench again, so the fan was moved.'))

describe('what is found', () => {
  const index = indexOf(
    aDocument({ id: 1, title: 'Hole sizes for grommets', labels: 'W-3 Wing ribs to spar\nfirewall grommet\nW3-2 step 6' }, 'A 3/8 grommet wants a hole of 0.562 in the web.'),
    aDocument({ id: 2, title: 'Nutplate rivets too long', labels: 'AN470AD4-6' }, 'The shop head touched the screw.'),
    aDocument({ id: 3, title: 'Deburr before fluting' }, 'Deburring the flange first keeps the flutes from cracking.'),
    aDocument({ id: 4, title: 'Noise in the tailcone' }, 'Wear hearing protection when riveting inside.'),
    ...filler,
  )

  test.each([
    ['grommet', 1, 'a word'], ['grommets hole size', 1, 'plurals'], ['gromet', 1, 'a letter left out'], ['grommte', 1, 'letters changed round'],
    ['rubber bush', 1, 'a phrase for a word'], ['anchor nut', 2, 'a phrase for another'], ['nut plate', 2, 'one word written as two'],
    ['deburring flutes', 3, 'forms of words'], ['ear muffs', 4, 'a one-way synonym'], ['AN 470 AD 4-6', 2, 'a designation written apart'],
    ['an470ad4', 2, 'a shorter designation'], ['.562', 1, 'a decimal'], ['W3-2 step 6', 1, 'a plans step'], ['how do I deburr a flange?', 3, 'a question'],
    ['grom', 1, 'the beginning of the last word'], ['wing ribs', 1, 'a section title'],
  ])('"%s" finds entry %i (%s)', (text, id) => {
    expect(idsFor(index, text)[0]).toBe(id)
  })

  test('a prefix needs three letters, and only the last word may be one', () => {
    expect(idsFor(index, 'gr')).toEqual([])
    expect(idsFor(index, 'gro ')).toEqual([])
    expect(idsFor(index, 'grom overspray')).not.toContain(1)
  })

  test('says which spelling was looked up', () => {
    expect(ask(index, 'gromet hole').didYouMean).toBe('grommet hole')
    expect(ask(index, 'grommet hole').didYouMean).toBeNull()
  })

  test('says plainly that nothing is there, instead of showing what shares one common word', () => {
    expect(ask(index, 'propeller pitch on skis')).toMatchObject({ hits: [], total: 0 })
    expect(ask(index, 'radio altimeter bench')).toMatchObject({ hits: [], total: 0, didYouMean: null })
  })

  test('stop words alone find nothing and are told', () => {
    expect(ask(index, 'how do I')).toMatchObject({ total: 0, ignored: ['how', 'do', 'I'] })
  })

  test('the words to mark are those of the text', () => {
    expect(ask(index, 'rubber bush').hits[0]?.terms).toEqual(expect.arrayContaining(['grommet', 'grommets']))
  })
})

describe('the order', () => {
  test('more of the question, rarer words and the title come first', () => {
    const index = indexOf(
      aDocument({ id: 1, title: 'Torque' }, 'The castle nut on the spar bolt: snug with a driver, then torque.'),
      aDocument({ id: 2, title: 'Spar bolt' }, 'The bolt was a dash too long, so a washer went under it.'),
      aDocument({ id: 3, title: 'Torque after snugging with a driver' }, 'Castle nuts: a driver first, then the wrench.'),
      ...filler,
    )
    expect(idsFor(index, 'torque castle nut driver')).toEqual([3, 1])
    expect(idsFor(index, 'spar bolt washer')).toEqual([2, 1])
  })

  test('the word itself ranks above its synonym', () => {
    const index = indexOf(aDocument({ id: 1 }, 'a rubber bush in the web'), aDocument({ id: 2 }, 'a grommet in the web'), ...filler)
    expect(idsFor(index, 'grommet')).toEqual([2, 1])
    expect(idsFor(index, 'rubber bush')).toEqual([1, 2])
  })

  test('what is proven ranks above the same words unproven, but not above a text that fits better', () => {
    const same = 'Flute the flange before priming the rib.'
    const index = indexOf(
      aDocument({ id: 1, passages: [{ postId: 1, text: same, weight: 1 }] }),
      aDocument({ id: 2, passages: [{ postId: 2, text: same, weight: 1.15 }] }),
      aDocument({ id: 3, passages: [{ postId: 3, text: 'The flange was short.', weight: 1.25 }] }),
      ...filler,
    )
    expect(idsFor(index, 'flute flange priming')).toEqual([2, 1, 3])
  })

  test('an entry comes once, with the post that shows best why', () => {
    const index = indexOf(aDocument({
      id: 1, kind: 'question', title: 'Which hole?',
      passages: [{ postId: 1, text: 'Which hole does it want?', weight: 1 }, { postId: 11, text: 'A step drill to 0.562, then a grommet.', weight: 1.15 }],
    }), ...filler)
    expect(ask(index, 'step drill grommet').hits).toMatchObject([{ id: 1, postId: 11 }])
    expect(ask(index, 'which hole').hits).toMatchObject([{ id: 1, postId: 1 }])
  })

  test('pages follow one another without gap or repetition', () => {
    const index = indexOf(...Array.from({ length: 45 }, (_, i) => aDocument({ id: i + 1, title: `Dimple dies ${i}` }, 'dimple '.repeat(1 + (i % 7)))))
    const pages = [0, 20, 40].flatMap((offset) => ask(index, 'dimple', {}, { offset }).hits.map((hit) => hit.id))
    expect(new Set(pages).size).toBe(45)
    expect(pages).toEqual(ask(index, 'dimple', {}, { limit: 100 }).hits.map((hit) => hit.id))
    expect(ask(index, 'dimple').total).toBe(45)
  })
})

test('filters are exact and the total is of what passes them', () => {
  const index = indexOf(
    aDocument({ id: 1, title: 'Clamp a fuel line', kit: 'whimbrel-2', sections: ['W-5'], operations: ['route-line'], stamped: true }),
    aDocument({ id: 2, title: 'Clamp a wire', kit: 'ouzel-3', sections: ['W-50'], operations: ['route-wire'], kind: 'question' }),
    ...filler,
  )
  expect(idsFor(index, 'clamp')).toHaveLength(2)
  expect(idsFor(index, 'clamp', { kit: 'whimbrel-2' })).toEqual([1])
  expect(idsFor(index, 'clamp', { section: 'W-5' })).toEqual([1])
  expect(idsFor(index, 'clamp', { operation: 'route-wire' })).toEqual([2])
  expect(idsFor(index, 'clamp', { kind: 'question' })).toEqual([2])
  expect(ask(index, 'clamp', { stamped: true })).toMatchObject({ total: 1, hits: [{ id: 1 }] })
})

describe('changes', () => {
  test('the old words of an edited entry are gone, also from spelling', () => {
    const index = indexOf(aDocument({ id: 1, title: 'Flaring a tube' }), ...filler)
    index.put(aDocument({ id: 1, title: 'Bending a longeron' }))
    expect(idsFor(index, 'flaring')).toEqual([])
    expect(idsFor(index, 'longerom')).toEqual([1])
    expect(index.suggest('flar', 5)).toEqual([])
  })

  test('after many changes the index answers like one built anew', () => {
    const words = ['rivet', 'spar', 'rib', 'flange', 'skin', 'dimple', 'prime', 'torque']
    const change = fc.record({ id: fc.integer({ min: 1, max: 6 }), words: fc.option(fc.array(fc.constantFrom(...words), { minLength: 1, maxLength: 4 })) })
    fc.assert(fc.property(fc.array(change, { maxLength: 40 }), fc.constantFrom(...words), (changes, query) => {
      const changed = indexOf(...filler)
      const last = new Map<number, string[]>()
      for (const { id, words: text } of changes) {
        if (text) changed.put(aDocument({ id }, text.join(' ')))
        else changed.remove(id)
        if (text) last.set(id, text)
        else last.delete(id)
      }
      const anew = indexOf(...filler, ...[...last].map(([id, text]) => aDocument({ id }, text.join(' '))))
      const answer = (index: SearchIndex) => ask(index, query).hits.map(({ id, terms }) => ({ id, terms }))
      expect(answer(changed)).toEqual(answer(anew))
      expect(changed.documents).toBe(anew.documents)
    }), { numRuns: 60 })
  })
})

describe('scores', () => {
  test('are those of an index made anew, however often an entry was edited before', () => {
    const entries = [aDocument({ id: 1, title: 'Labels before wiring' }, 'Labels first.'), aDocument({ id: 2, title: 'Labels on the lid' }, 'Labels last.')]
    const edited = indexOf(...entries)
    for (let edit = 0; edit < 30; edit++) edited.put(aDocument({ id: 2, title: 'Labels on the lid' }, `Labels last. ${'Labels. '.repeat(edit)}`))
    for (const entry of entries) edited.put(entry)
    const scores = (index: SearchIndex) => ask(index, 'labels').hits.map(({ id, score }) => ({ id, score: score.toFixed(9) }))
    expect(scores(edited)).toEqual(scores(indexOf(...entries)))
    expect(ask(edited, 'labels').hits.every(({ score }) => score > 0)).toBe(true)
  })
})

describe('similar and suggest', () => {
  const index = indexOf(
    aDocument({ id: 1, title: 'Which drill for a #30 hole in the rib flange' }, 'The flange is .025 and the dimple comes later.'),
    aDocument({ id: 2, title: 'Which primer for the ribs' }, 'Epoxy or wash primer on ribs and skins.'),
    ...filler,
  )

  test('an entry like what is being asked is offered, others are not', () => {
    expect(index.similar('Drill size for the flange of a rib\nI want to open the flange hole to #30 and dimple it later, the drill walks.', {}, 5).map((hit) => hit.id)).toEqual([1])
    expect(index.similar('Canopy latch adjustment with two bolts', {}, 5)).toEqual([])
  })

  test('titles are completed as they are typed, stop words and all', () => {
    expect(index.suggest('which pri', 8)).toEqual([{ id: 2, title: 'Which primer for the ribs' }])
    expect(index.suggest('which', 8)).toHaveLength(2)
    expect(index.suggest('w', 8)).toEqual([])
  })
})

describe('bad input', () => {
  let index: SearchIndex
  beforeAll(() => {
    const words = Array.from({ length: 400 }, (_, i) => `word${String.fromCharCode(97 + (i % 26))}${String.fromCharCode(97 + Math.floor(i / 26))}`)
    index = indexOf(...Array.from({ length: 400 }, (_, i) => aDocument({ id: i + 1, title: words[i] ?? '' }, words.slice(i, i + 40).join(' '))))
  })

  test('at most 24 terms are searched, the rarest; the rest is told', () => {
    const rare = Array.from({ length: 24 }, (_, i) => `rare${String.fromCharCode(97 + i)}x`)
    const common = Array.from({ length: 6 }, (_, i) => `common${String.fromCharCode(97 + i)}x`)
    const small = indexOf(
      ...rare.map((word, i) => aDocument({ id: i + 1 }, `${word} ${common.join(' ')}`)), ...filler,
    )
    expect(ask(small, [...common, ...rare].join(' ')).ignored.sort()).toEqual(common.sort())
  })

  test.each([
    ['letters', 'a'.repeat(10_000)], ['digits', '1/'.repeat(5_000)], ['designations', 'AN 470 AD 4-'.repeat(800)], ['hyphens', 'a-'.repeat(5_000)],
    ['combining marks', `a${'\u0301'.repeat(9_999)}`], ['emoji', '😀é'.repeat(3_000)], ['lone surrogates', '\ud800a'.repeat(5_000)],
    ['names of object members', '__proto__ constructor hasOwnProperty toString '.repeat(200)], ['control characters', '\u0000\u001b\u202e'.repeat(3_000)], ['nothing', ''],
  ])('10 kB of %s are answered without an error and at once', (_, text) => {
    const begun = performance.now()
    expect(ask(index, text).hits.length).toBeLessThanOrEqual(20)
    index.similar(text, {}, 5)
    index.suggest(text, 8)
    expect(performance.now() - begun).toBeLessThan(1_000)
  })

  test('any string is answered', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (text) => {
      expect(ask(index, text).total).toBeGreaterThanOrEqual(0)
      index.similar(text, {}, 5)
      index.suggest(text, 8)
    }))
  })
})
