import { describe, expect, test } from 'vitest'
import { entryWeight } from '@/lib/domain/search/entry-weight'
import { evidenceWeight, type EvidenceFact } from '@/lib/domain/search/evidence-weight'
import { stampStates } from '@/lib/domain/stamps/stamp-state'

const weight = (fact: Partial<EvidenceFact>) => evidenceWeight({ stampState: 'none', critical: false, asWritten: 0, withChange: 0, didNotWork: 0, ...fact })

describe('evidence weight', () => {
  test('falls from stamped to in question, and withdrawn is never shown', () => {
    const falling = (['stamped', 'one-of-two', 'imported', 'none', 'lapsed', 'plans-changed', 'in-question', 'withdrawn'] as const).map((stampState) => weight({ stampState }))
    expect(falling).toEqual([...falling].sort((a, b) => b - a))
    expect(new Set(falling).size).toBe(falling.length)
    expect(falling.at(-1)).toBe(0)
  })

  test('off critical systems what worked raises and what failed lowers', () => {
    // Wilson lower bound of 10 of 10 at 95 %, without continuity correction: 0.7225 (1 / (1 + 1.96² / 10)).
    expect(weight({ asWritten: 7, withChange: 3 })).toBeCloseTo(1 + 0.1 * 0.7225, 3)
    expect(weight({ didNotWork: 1 })).toBeLessThan(weight({}))
    expect(weight({ asWritten: 1 })).toBeGreaterThan(weight({}))
  })

  test('on critical systems how it went never ranks', () => {
    expect(weight({ critical: true, asWritten: 50 })).toBe(weight({ critical: true, didNotWork: 50 }))
  })

  test('stays between 0.85 and 1.25 for all that may be shown', () => {
    for (const stampState of stampStates.filter((state) => state !== 'withdrawn')) {
      for (const fact of [{ asWritten: 10_000 }, { didNotWork: 10_000 }, {}]) {
        expect(weight({ stampState, ...fact })).toBeGreaterThanOrEqual(0.85)
        expect(weight({ stampState, ...fact })).toBeLessThanOrEqual(1.25)
      }
    }
  })

  test('a question is worth what its best answer is worth, and less while it has none', () => {
    const own = { weight: 1 }
    expect(entryWeight({ kind: 'question', passages: [own, { weight: 0.85 }, { weight: 1.15 }] })).toBe(1.15)
    expect(entryWeight({ kind: 'question', passages: [own] })).toBeLessThan(1)
    expect(entryWeight({ kind: 'lesson', passages: [{ weight: 1.15 }] })).toBe(1.15)
  })
})
