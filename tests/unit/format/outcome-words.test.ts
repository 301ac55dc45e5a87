// How it went is told in counts and the builders' own words, never as an average.
import { describe, expect, it } from 'vitest'
import { outcomePhrases } from '@/lib/format/outcome-words'

const outcomes = {
  asWritten: 5, withChange: 1, didNotWork: 0,
  items: [{ result: 'as-written' as const, note: 'fine' }, { result: 'with-change' as const, note: ' every hole clecoed ' }],
}

describe('how it went in words', () => {
  it('on a critical system "as written" says only that it went together', () => {
    expect(outcomePhrases(outcomes, true, false)[0]).toEqual({ count: 5, words: 'went together as written' })
    expect(outcomePhrases(outcomes, false, false)[0]).toEqual({ count: 5, words: 'as written' })
  })

  it('a change told once carries its words, told twice it does not', () => {
    expect(outcomePhrases(outcomes, false, true)[1]).toEqual({ count: 1, words: 'with a change: every hole clecoed' })
    expect(outcomePhrases({ ...outcomes, withChange: 2 }, false, true)[1]?.words).toBe('with a change')
  })

  it('what nobody reported is left out', () => {
    expect(outcomePhrases(outcomes, false, true)).toHaveLength(2)
    expect(outcomePhrases({ asWritten: 0, withChange: 0, didNotWork: 0, items: [] }, false, true)).toEqual([])
  })
})
