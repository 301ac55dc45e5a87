// What a stamp says to those who do not see it, and which of its looks it has.
import { describe, expect, it } from 'vitest'
import { stampCondition, stampNote, stampSentence, type StampFace } from '@/lib/format/stamp-words'

const stamp: StampFace = {
  revision: 'B', mentor: { mark: 'IC 042' }, basis: 'standard', reference: 'AC 43.13-1B para 4-57', createdAt: '2026-03-11T10:00:00.000Z', live: true,
}

describe('a stamp in words', () => {
  it('names mark, basis, reference, date and revision, and that only the advice was checked', () => {
    expect(stampSentence(stamp, 'live')).toBe('Stamp IC 042, published standard AC 43.13-1B para 4-57, 11 March 2026, on revision B. Advice checked, work not inspected.')
  })

  it('says how far a maker’s reply reaches, and which plans revision was read', () => {
    expect(stampSentence({ ...stamp, basis: 'maker-reply', reference: 'letter of 2 March', scope: 'all-kits' }, 'live')).toContain('kit maker’s written reply letter of 2 March (all kits)')
    expect(stampSentence({ ...stamp, basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' }, 'live')).toContain('plans step W3-2 step 6 Rev C,')
  })

  it('a withdrawn stamp gives date and reason', () => {
    const withdrawn = { ...stamp, live: false, withdrawn: { at: Date.UTC(2026, 2, 20), reason: 'Wrong table.' } }
    expect(stampCondition(withdrawn, 'withdrawn')).toBe('withdrawn')
    expect(stampSentence(withdrawn, 'withdrawn')).toMatch(/Withdrawn on 20 March 2026: Wrong table\.$/)
  })

  it('every condition but live has a note, and every sentence says that work was not inspected', () => {
    for (const condition of ['lapsed', 'plans-changed', 'in-question', 'withdrawn'] as const) {
      expect(stampNote(condition)).toBeTruthy()
      expect(stampSentence(stamp, condition)).toContain('Advice checked, work not inspected.')
    }
    expect(stampNote('live')).toBeNull()
  })
})

describe('the look of a stamp', () => {
  it('an old stamp beside a live one is lapsed, the live one is not', () => {
    expect(stampCondition({ ...stamp, live: false }, 'stamped')).toBe('lapsed')
    expect(stampCondition(stamp, 'stamped')).toBe('live')
  })

  it('in question goes across live stamps only', () => {
    expect(stampCondition(stamp, 'in-question')).toBe('in-question')
    expect(stampCondition({ ...stamp, live: false }, 'in-question')).toBe('lapsed')
  })

  it('a bulletin marks stamps whether or not they still stand', () => {
    expect(stampCondition(stamp, 'plans-changed')).toBe('plans-changed')
    expect(stampCondition({ ...stamp, live: false }, 'plans-changed')).toBe('plans-changed')
  })
})
