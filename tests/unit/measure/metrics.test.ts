import { describe, expect, test } from 'vitest'
import { averagePrecision, dcg, meanOf, ndcg, precision, recall, scoresOf } from '../../measure/search/metrics'

/** A ranked list written as the books write it, R relevant and N not, with `more` relevant documents that were not found. */
function ranking(marks: string, more = 0) {
  const letters = marks.replaceAll(' ', '').split('')
  const gains = new Map<string, number>(letters.flatMap((mark, i) => (mark === 'R' ? [[`d${i + 1}`, 1] as const] : [])))
  for (let i = 0; i < more; i++) gains.set(`missed${i}`, 1)
  return { ranked: letters.map((_, i) => `d${i + 1}`), gains }
}
const graded = (...gains: number[]) => new Map(gains.map((gain, i) => [`d${i + 1}`, gain]))

// C. D. Manning, P. Raghavan, H. Schütze: Introduction to Information Retrieval (Cambridge University Press 2008), chapter 8.
// The lists are quoted from memory of the printed exercises; every expected value is worked out beside its check.
describe('the exercises of chapter 8 of Introduction to Information Retrieval', () => {
  test('8.8: two systems, four relevant documents: the first has the higher mean average precision', () => {
    const [one, two] = [ranking('R N R N N N N N R R'), ranking('N R N N R R R N N N')]
    expect(averagePrecision(one.ranked, one.gains, 1)).toBeCloseTo((1 / 1 + 2 / 3 + 3 / 9 + 4 / 10) / 4, 12) // 0.6
    expect(averagePrecision(one.ranked, one.gains, 1)).toBeCloseTo(0.6, 3)
    expect(averagePrecision(two.ranked, two.gains, 1)).toBeCloseTo(0.493, 3) // (1/2 + 2/5 + 3/6 + 4/7) / 4
  })

  test('8.9: twenty results of eight relevant documents: precision 0.3, six of eight found', () => {
    const { ranked, gains } = ranking('R R N N N N N N R N R N N N R N N N N R', 2)
    expect(precision(ranked, gains, 1, 20)).toBeCloseTo(0.3, 12)
    expect(recall(ranked, gains, 1, 20)).toBeCloseTo(6 / 8, 12)
    // (1 + 1 + 3/9 + 4/11 + 5/15 + 6/20) / 8 = 3.3303 / 8
    expect(averagePrecision(ranked, gains, 1)).toBeCloseTo(0.4163, 4)
  })
})

// The worked example of Wikipedia, "Discounted cumulative gain" (quoted from memory, terms checked by hand): gains 3 2 3 0 1 2 in the
// order found, 3 and 2 not found. 3 + 2/1.585 + 3/2 + 0 + 1/2.585 + 2/2.807 = 6.861; best 3 3 3 2 2 2 = 8.740; 0.785.
test('discounted cumulative gain is that of the worked example', () => {
  expect(dcg([3, 2, 3, 0, 1, 2], 6)).toBeCloseTo(6.861, 3)
  expect(dcg([3, 3, 3, 2, 2, 2], 6)).toBeCloseTo(8.74, 3)
  expect(ndcg(['d1', 'd2', 'd3', 'd4', 'd5', 'd6'], graded(3, 2, 3, 0, 1, 2, 3, 2), 6)).toBeCloseTo(0.785, 3)
})

describe('limits', () => {
  test('the best order is worth 1, nothing found 0, and nothing to find 0', () => {
    const gains = graded(3, 2, 1)
    expect(scoresOf(['d1', 'd2', 'd3'], gains, { relevant: 1, success: 2 })).toEqual({ averagePrecision: 1, ndcg10: 1, precision5: 3 / 5, recall100: 1, reciprocalRank: 1, success1: 1, success3: 1 })
    const none = { averagePrecision: 0, ndcg10: 0, precision5: 0, recall100: 0, reciprocalRank: 0, success1: 0, success3: 0 }
    expect(scoresOf([], gains, { relevant: 1, success: 2 })).toEqual(none)
    expect(scoresOf(['d1'], new Map(), { relevant: 1, success: 2 })).toEqual(none)
    expect(meanOf([])).toEqual(none)
  })

  test('success needs the gain asked for, within one or three places', () => {
    const gains = graded(1, 0, 3)
    expect(scoresOf(['d1', 'd2', 'd3'], gains, { relevant: 1, success: 2 })).toMatchObject({ reciprocalRank: 1 / 3, success1: 0, success3: 1 })
    expect(scoresOf(['d1', 'd2', 'x', 'd3'], gains, { relevant: 1, success: 2 })).toMatchObject({ reciprocalRank: 1 / 4, success1: 0, success3: 0 })
  })

  test('only the first hundred count for recall, the first ten for the gain', () => {
    const ranked = Array.from({ length: 100 }, (_, i) => `x${i}`)
    expect(recall([...ranked, 'd1'], graded(1), 1, 100)).toBe(0)
    expect(recall([...ranked.slice(1), 'd1'], graded(1), 1, 100)).toBe(1)
    expect(ndcg([...ranked.slice(0, 10), 'd1'], graded(1), 10)).toBe(0)
  })
})
