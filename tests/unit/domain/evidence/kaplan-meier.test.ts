// Time to an answer against published survival tables (the data as remembered; the estimates are the ones that any statistics package prints for it).
import { describe, expect, it } from 'vitest'
import { kaplanMeier, type Observation } from '@/lib/domain/evidence/kaplan-meier'

const read = (text: string): Observation[] => text.split(' ').map((word) => ({ time: Number(word.replace('+', '')), happened: !word.endsWith('+') }))

describe('published examples', () => {
  it('weeks of remission under 6-MP (E. J. Freireich et al., Blood 21 (1963) 699; table in D. G. Kleinbaum and M. Klein, Survival Analysis, 3rd ed., ch. 2)', () => {
    const { steps, median } = kaplanMeier(read('6 6 6 7 10 13 16 22 23 6+ 9+ 10+ 11+ 17+ 19+ 20+ 25+ 32+ 32+ 34+ 35+'))
    expect(steps.map(({ time, atRisk, events, waiting }) => [time, atRisk, events, Number(waiting.toFixed(4))])).toEqual([
      [6, 21, 3, 0.8571], [7, 17, 1, 0.8067], [10, 15, 1, 0.7529], [13, 12, 1, 0.6902], [16, 11, 1, 0.6275], [22, 7, 1, 0.5378], [23, 6, 1, 0.4482],
    ])
    expect(median).toBe(23)
    // Greenwood's standard errors as the same table has them (R, survival package, prints 0.0764 and 0.1346).
    expect([steps[0], steps[6]].map((step) => Number(step?.standardError.toFixed(4)))).toEqual([0.0764, 0.1346])
  })

  it('the placebo group of the same trial, in which nobody is censored', () => {
    const { steps, median } = kaplanMeier(read('1 1 2 2 3 4 4 5 5 8 8 8 8 11 11 12 12 15 17 22 23'))
    expect(steps.map(({ time, waiting }) => [time, Number(waiting.toFixed(4))])).toEqual([
      [1, 0.9048], [2, 0.8095], [3, 0.7619], [4, 0.6667], [5, 0.5714], [8, 0.381], [11, 0.2857], [12, 0.1905], [15, 0.1429], [17, 0.0952], [22, 0.0476], [23, 0],
    ])
    expect(median).toBe(8)
  })
})

describe('at the edges', () => {
  it('nothing asked has no curve', () => {
    expect(kaplanMeier([])).toEqual({ steps: [], median: null })
  })

  it('while more than half wait there is no median', () => {
    expect(kaplanMeier(read('1 5+ 5+ 5+')).median).toBeNull()
  })

  it('half exactly is the median', () => {
    expect(kaplanMeier(read('1 2 3 4')).median).toBe(2)
    expect(kaplanMeier(read('1 2 3 4 5 6')).median).toBe(3)
  })

  it('what is no time counts for nothing', () => {
    expect(kaplanMeier([{ time: Number.NaN, happened: true }, { time: -1, happened: true }, { time: 2, happened: true }]).steps).toMatchObject([{ time: 2, atRisk: 1 }])
  })
})
