import { describe, expect, test } from 'vitest'
import { feedbackTerms } from '@/lib/domain/search/feedback-terms'
import { aDocument, idsFor, indexOf } from './corpus'

const evenly = () => 1

describe('what the entries found first share', () => {
  test('a term of one entry only, and one that was asked for, are no help', () => {
    const found = [{ score: 2, terms: ['rivet', 'tail', 'alone'] }, { score: 1, terms: ['rivet', 'tail', 'other'] }]
    expect(feedbackTerms(found, new Set(['rivet']), evenly, 10)).toEqual([{ term: 'tail', share: 1 }])
  })

  test('more often, in better entries and rarer counts more; the first is 1', () => {
    // a: 2 × 2/4 + 1 × 1/4 = 1.25, b: 2 × 1/4 + 1 × 3/4 = 1.25 but half as rare, c: 2 × 1/4 + 0 is in one entry only.
    const found = [{ score: 2, terms: ['a', 'a', 'b', 'c'] }, { score: 1, terms: ['a', 'b', 'b', 'b'] }]
    expect(feedbackTerms(found, new Set(), (term) => (term === 'b' ? 0.5 : 1), 10)).toEqual([{ term: 'a', share: 1 }, { term: 'b', share: 0.5 }])
    expect(feedbackTerms(found, new Set(), evenly, 1)).toHaveLength(1)
  })
})

describe('a long question', () => {
  const filler = Array.from({ length: 12 }, (_, i) => aDocument({ id: 100 + i, title: `Paint booth diary ${i}` }, 'Overspray settled on the bench again, so the fan was moved.'))
  const index = indexOf(
    aDocument({ id: 1 }, 'gasket leak heater cabin muff muff'), aDocument({ id: 2 }, 'gasket leak heater cabin muff'),
    aDocument({ id: 3, createdAt: 1 }, 'gasket leak muff weld crack'), aDocument({ id: 4, createdAt: 9 }, 'gasket leak radio panel light'), ...filler,
  )

  test('prefers of equals the entry that speaks of what the best ones speak of', () => {
    const ids = idsFor(index, 'gasket leak heater cabin')
    expect(ids.indexOf(3)).toBeLessThan(ids.indexOf(4))
  })

  test('finds nothing by that alone', () => {
    const muffOnly = indexOf(aDocument({ id: 1 }, 'gasket leak heater muff'), aDocument({ id: 2 }, 'gasket leak heater muff'), aDocument({ id: 5 }, 'muff muff muff'), ...filler)
    expect(idsFor(muffOnly, 'gasket leak heater')).toEqual([2, 1])
  })
})

test('two words written as one are found beside the words themselves', () => {
  const index = indexOf(
    aDocument({ id: 1 }, 'a gearleg out of true in the jig at noon'), aDocument({ id: 2, createdAt: 1 }, 'a gear leg out of true in the jig'),
    aDocument({ id: 3 }, 'a door out of true in the jig'), aDocument({ id: 4 }, 'a leg of the trip in the rain'),
  )
  expect(idsFor(index, 'gear leg').slice(0, 2).sort()).toEqual([1, 2])
})
