// A search explained: every number is the one that ranked, and every route says why it was taken.
import { describe, expect, test } from 'vitest'
import type { SearchFilters } from '@/lib/search/messages'
import type { SearchIndex } from '@/lib/search/search-index'
import { aDocument, ask, indexOf } from './corpus'

const filler = Array.from({ length: 12 }, (_, i) => aDocument({ id: 100 + i, title: `Paint booth diary ${i}` }, 'Overspray settled on the bench again, so the fan was moved.'))
const deburr = { slug: 'deburr-holes', title: 'deburr holes', operation: 'deburr' }
const flute = { slug: 'flute', title: 'flute flanges', operation: 'flute' }
const index = indexOf(
  aDocument({ id: 1, title: 'Grommet hole sizes', labels: 'W3-2 step 6', passages: [{ postId: 1, text: 'A 3/8 grommet wants a hole of 0.562 in the web.', weight: 1.15 }] }),
  aDocument({ id: 2, title: 'Nutplate rivets too long', labels: 'AN470AD4-6\nW3-2 step 7' }, 'The shop head touched the screw, a hole away from the grommet.'),
  aDocument({ id: 3, kind: 'question', title: 'Flute the flange or deburr the hole?', orderAdvice: [{ postId: 31, before: deburr, after: flute }],
    passages: [{ postId: 3, text: 'Which comes first?', weight: 1 }, { postId: 31, text: 'Deburr, then flute.', weight: 1.08 }, { postId: 32, text: 'Either.', weight: 0.97 }] }),
  aDocument({ id: 4, kind: 'question', open: true, title: 'A rubber bush for the hole' }, 'Is it the same?'),
  ...filler,
)
const explain = (text: string, filters: SearchFilters = {}, of: SearchIndex = index) => of.explain({ text, filters, limit: 20, offset: 0 })
const queries = ['grommet hole', 'gromet hole size', 'anchor nut', 'W3-2 step 6', 'deburr or flute first', 'an470ad4', 'hole', 'nut plate grommet', 'paint ov', 'propeller pitch on skis']

describe('the explanation of a search', () => {
  test.each(queries)('of "%s" has the hits of the search, in its order, with its scores', (text) => {
    const { hits, total } = ask(index, text)
    const explained = explain(text)
    expect(explained.hits.map(({ id, score }) => ({ id, score }))).toEqual(hits.map(({ id, score }) => ({ id, score })))
    expect(explained.total).toBe(total)
  })

  test.each(queries)('of "%s": points of the terms add up to the text score, and the factors multiply to the score', (text) => {
    for (const { terms, text: score, evidence, directness, ...hit } of explain(text).hits) {
      expect(terms.reduce((sum, term) => sum + term.points, 0)).toBeCloseTo(score, 9)
      expect(score * evidence * directness + hit.shared).toBeCloseTo(hit.score, 9)
      expect(terms.every((term) => term.title + term.labels + term.passages > 0)).toBe(true)
    }
  })

  test.each(queries)('of "%s": what is considered is what is shown and what is cut, and the shares of the words make the whole', (text) => {
    const { considered, cut, total, concepts, hits, best, cutBelow } = explain(text)
    expect(cut).toBe(considered - total)
    if (concepts.length > 0) expect(concepts.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 9)
    for (const { coverage } of hits) expect(coverage).toBeGreaterThanOrEqual(cutBelow)
    for (const { coverage } of hits) expect(coverage).toBeLessThanOrEqual(best)
  })

  test.each([
    ['grommet', 'grommet', 'as written', 'grommet'], ['grommet', 'grommet', 'synonym', 'grommet, rubber bush'], ['anchor nut', 'anchor', 'synonym', 'nut plate, nutplate, anchor nut'],
    ['an470ad4', 'an470ad4', 'broader spelling', 'an470'], ['gromet hole', 'gromet', 'meant', 'grommet'], ['hole grom', 'grom', 'half typed', 'grommet'],
    ['W3-2 step 6', 'W3-2 step 6', 'plans step', 'w3-2 step 6'], ['W3-2 step 6', 'W3-2 step 6', 'plans page', 'any step of w3-2'], ['shopp-head', 'shopp', 'meant', 'shop'],
    ['paintbooth', 'paintbooth', 'split', 'paint + booth'],
  ])('"%s": %s is looked up as %s (%s)', (text, word, how, looksUp) => {
    const concept = explain(text).concepts.find((c) => c.word === word)
    expect(concept?.routes).toEqual(expect.arrayContaining([expect.objectContaining({ how, looksUp })]))
  })

  test('says whose evidence counts: of a question the best answer’s, unanswered ones count less', () => {
    const [hit] = explain('flute flange deburr').hits
    expect(hit).toMatchObject({ id: 3, evidence: 1.08, evidenceOf: 31, directness: 1 })
    expect(explain('rubber bush').hits.find(({ id }) => id === 4)).toMatchObject({ evidence: 0.95, evidenceOf: 4 })
  })

  test('says what speaks directly to the question', () => {
    expect(explain('deburr or flute first')).toMatchObject({ order: { one: ['deburr-holes'], other: ['flute'] }, hits: [{ id: 3, advises: true, directness: 1.5, advice: [{ postId: 31 }] }] })
    expect(explain('W3-2 step 6').hits).toMatchObject([{ id: 1, place: 'step', directness: 2.25 }, { id: 2, place: 'page', directness: 1.5 }])
    expect(explain('W3-2 step 6').places).toEqual([{ page: 'w3-2', step: '6' }])
  })

  test('says why nothing is shown', () => {
    const { hits, best, least, cut, considered } = explain('hole for a propeller governor on skis')
    expect(hits).toEqual([])
    expect(best).toBeLessThan(least)
    expect(cut).toBe(considered)
    expect(considered).toBeGreaterThan(0)
  })

  test('filters hold', () => {
    expect(explain('hole', { kind: 'question' }).hits.map(({ id }) => id).sort()).toEqual([3, 4])
  })
})
