import { expect, it } from 'vitest'
import { axisTicks } from '@/lib/domain/evidence/axis-ticks'
import { spanWords } from '@/lib/format/span-words'

it.each([[0, '0 minutes'], [1 / 24 / 60, '1 minute'], [0.5, '12 hours'], [1.99, '48 hours'], [2.46, '2.5 days'], [9.99, '10 days'], [12.4, '12 days'], [63, '9 weeks']])('%f days read %s', (days, words) => {
  expect(spanWords(days)).toBe(words)
})

it.each([[0, [0, 1]], [Number.NaN, [0, 1]], [1, [0, 0.2, 0.4, 0.6, 0.8, 1]], [23, [0, 5, 10, 15, 20, 25]], [35, [0, 10, 20, 30, 40]], [400, [0, 100, 200, 300, 400]], [0.05, [0, 0.01, 0.02, 0.03, 0.04, 0.05]]])('an axis to %f has round places', (end, ticks) => {
  expect(axisTicks(end)).toEqual(ticks)
})
