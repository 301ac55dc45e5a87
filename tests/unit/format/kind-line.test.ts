// The line over a hit says what was found.
import { describe, expect, it } from 'vitest'
import { hitKindLine, type HitKind } from '@/lib/format/kind-line'

const hit = (over: Partial<HitKind>, kind: HitKind['passage']['kind']): HitKind => ({
  open: false, answers: 0, stamp: 'none', passage: { kind, author: { name: 'Marit Osei' }, revision: 'B' }, ...over,
})

describe('the line over a hit', () => {
  it('a lesson and an answer carry author and revision', () => {
    expect(hitKindLine(hit({ stamp: 'stamped' }, 'lesson'))).toBe('Lesson · Marit Osei · Rev B')
    expect(hitKindLine(hit({ stamp: 'one-of-two' }, 'answer'))).toBe('What to do · Marit Osei · Rev B · 1 of 2 stamps')
  })

  it('a question says how many rows it has and what became of the stamp', () => {
    expect(hitKindLine(hit({ answers: 1, stamp: 'lapsed' }, 'question'))).toBe('Question · Marit Osei · 1 row, stamp lapsed')
    expect(hitKindLine(hit({ answers: 3 }, 'question'))).toBe('Question · Marit Osei · 3 rows')
  })

  it('a question without an answer is open', () => {
    expect(hitKindLine(hit({ open: true }, 'question'))).toBe('Open question · Marit Osei')
  })
})
