// What a steward reads of a score, and what a builder reads of order advice.
import { describe, expect, it } from 'vitest'
import { directWords, evidenceWords, factor, percent, points, type EvidenceShown } from '@/lib/format/explain-words'
import { findContrary, orderWords } from '@/lib/format/order-words'

const evidence = (over: Partial<EvidenceShown>) => evidenceWords({ kind: 'answer', stamp: 'none', critical: false, asWritten: 0, withChange: 0, didNotWork: 0, ofStamp: 1, ofOutcomes: 0, ...over })

describe('the words of an explanation', () => {
  it('numbers are short', () => {
    expect([percent(0.456), points(12.345), points(0.1234), factor(1.15), factor(1), factor(0.95)]).toEqual(['46 %', '12.3', '0.12', '× 1.15', '× 1', '× 0.95'])
  })

  it('evidence says the stamp, and how it went only where it ranks', () => {
    expect(evidence({ stamp: 'stamped', ofStamp: 1.15, asWritten: 3, didNotWork: 1, ofOutcomes: 0.03 })).toBe('What to do, stamped (1.15), and how it went: 3 as written, 1 did not work (+ 0.03)')
    expect(evidence({ didNotWork: 2, ofOutcomes: -0.05 })).toBe('What to do, no stamp (1), and how it went: 2 did not work (− 0.05)')
    expect(evidence({ critical: true, asWritten: 9 })).toBe('What to do, no stamp (1); on a critical system how it went never ranks')
    expect(evidence({ kind: 'lesson' })).toBe('Lesson, no stamp (1); nobody has told how it went')
    expect(evidence({ kind: 'question' })).toBe('A question without an answer helps least')
  })

  it('directness says what it is', () => {
    expect(directWords({ advises: true, place: 'step' })).toBe('its order advice is about these two tasks; it is about this very step')
    expect(directWords({ advises: false, place: null })).toBe('')
  })
})

describe('order advice', () => {
  const [a, b] = [{ before: 'deburr edges', after: 'flute' }, { before: 'flute', after: 'deburr edges' }]

  it('is said once each', () => {
    expect(orderWords([a, a, b])).toBe('deburr edges before flute; flute before deburr edges')
  })

  it('disagrees only where the same two stand both ways round', () => {
    expect(findContrary([a, b])).toEqual({ one: 'deburr edges', other: 'flute' })
    expect(findContrary([a, a, { before: 'flute', after: 'deburr holes' }])).toBeNull()
    expect(findContrary([])).toBeNull()
  })
})
