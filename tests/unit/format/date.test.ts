// Dates read the same on server and browser, whatever the zone and the ICU of either.
import { describe, expect, it } from 'vitest'
import { formatAge, formatDate, formatFullDate, formatStampDate, isoDate } from '@/lib/format/date'

const at = Date.UTC(2026, 2, 9, 23, 59)

describe('dates', () => {
  it('a date is written day, short month, year', () => {
    expect(formatDate(at)).toBe('9 Mar 2026')
    expect(formatDate(Date.UTC(2026, 8, 1))).toBe('1 Sep 2026')
  })

  it('an ISO moment with another zone counts as its UTC day', () => {
    expect(formatDate('2026-03-10T00:30:00.000+01:00')).toBe('9 Mar 2026')
  })

  it('a stamp carries a two-digit year in capitals', () => {
    expect(formatStampDate(Date.UTC(2026, 2, 11))).toBe('11 MAR 26')
    expect(formatStampDate(Date.UTC(2009, 0, 2))).toBe('2 JAN 09')
  })

  it('a sentence spells the month, an attribute is ISO 8601', () => {
    expect(formatFullDate(at)).toBe('9 March 2026')
    expect(isoDate(at)).toBe('2026-03-09')
  })

  it.each([
    [Date.UTC(2026, 2, 9, 0, 1), 'today'],
    [Date.UTC(2026, 2, 8, 23, 58), 'yesterday'],
    [Date.UTC(2026, 2, 6), '3 days ago'],
    [Date.UTC(2026, 1, 23), '2 weeks ago'],
    [Date.UTC(2025, 10, 9), '3 months ago'],
    [Date.UTC(2023, 2, 1), '3 years ago'],
    [Date.UTC(2026, 2, 12), 'today'],
  ])('the age of %d reads %s', (then, words) => {
    expect(formatAge(then, at)).toBe(words)
  })
})
