// Percentiles against the published example.
import fc from 'fast-check'
import { expect, it } from 'vitest'
import { percentile, quartiles } from '@/lib/domain/evidence/quartiles'

it('NIST/SEMATECH e-Handbook, 7.2.6.2: the 90th percentile of twelve measurements is 95.1981', () => {
  const measured = [95.1772, 95.1567, 95.1937, 95.1959, 95.1442, 95.061, 95.1591, 95.1195, 95.1065, 95.0925, 95.199, 95.1682]
  expect(percentile(measured, 0.9).toFixed(4)).toBe('95.1981')
})

it('nothing has no quartiles, and one number is all three', () => {
  expect(quartiles([])).toBeNull()
  expect(quartiles([4])).toEqual({ lower: 4, median: 4, upper: 4 })
  expect(() => percentile([], 0.5)).toThrow(RangeError)
})

it('the quartiles lie within the numbers and in order, whatever the order given', () => {
  fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 10_000 }), { minLength: 1, maxLength: 40 }), (values) => {
    const found = quartiles(values)
    expect(found).toEqual(quartiles([...values].reverse()))
    const { lower, median, upper } = found ?? { lower: 0, median: 0, upper: 0 }
    expect([Math.min(...values), lower, median, upper, Math.max(...values)]).toEqual([Math.min(...values), lower, median, upper, Math.max(...values)].sort((a, b) => a - b))
  }))
})
