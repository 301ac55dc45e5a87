// How bulletins enter the judgement of a post: which steps they name, which stamps they outdate, and that the order of facts is nothing.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isSamePlace, namesPlace, stepsNamed, type BulletinFact } from '@/lib/domain/stamps/plans-change'
import { judgeStamps, type StampFact, type StampSubject } from '@/lib/domain/stamps/stamp-state'

const stamp = (over: Partial<StampFact> = {}): StampFact => ({ revision: 1, questionRevision: 0, mentorId: 7, basis: 'plans', scope: null, reference: 'W4-1 step 3', createdAt: 100, withdrawnAt: null, ...over })
const bulletin = (over: Partial<BulletinFact> = {}): BulletinFact => ({ number: 'SB-3', enteredAt: 200, steps: [{ page: 'W4-1', step: '3', revision: 'D' }], ...over })
const subject = (over: Partial<StampSubject> = {}): StampSubject => ({
  currentRevision: 1, questionRevision: 0, needsTwo: false, postState: 'visible', authorIds: [1], failuresAt: [], revisedAt: 50,
  plans: [{ page: 'W4-1', step: '3' }], stamps: [stamp()], bulletins: [bulletin()], ...over,
})
const stateOf = (over: Partial<StampSubject> = {}) => judgeStamps(subject(over)).state

describe('which places are the same', () => {
  it.each([
    ['w4 - 1', '3', 'W4-1', '3', true], ['W4-1', '3', 'W4-1', '4', false], ['W4-1', '3', 'W4-1', undefined, true], ['W4-1', undefined, 'W4-1', '3', true],
    ['W4-1', '3', 'W4-11', '3', false], ['W4-1', '2-4', 'W4-1', '3', true], ['W4-1', '2 to 4', 'W4-1', '5', false], ['W4-1', '2, 6 and 7', 'W4-1', '6', true], ['W4-1', '3A', 'W4-1', '3a', true],
  ] as const)('%s step %s and %s step %s', (page, step, otherPage, otherStep, same) => {
    const [a, b] = [{ page, step }, { page: otherPage, step: otherStep }]
    expect([isSamePlace(a, b), isSamePlace(b, a)]).toEqual([same, same])
  })

  it.each([
    ['W4-1 steps 3 and 4, depth gauged', '4', true], ['w4-1, step 3', '3', true], ['T3-4 steps 1 to 3', '2', false], ['W4-1 step 3', '4', false], ['W4-11 step 3', '3', false],
    ['XW4-1 step 3', '3', false], ['W4-1: bolt call-outs', '9', true], ['W5-3 step 7 and W4-1 step 3', '3', true], ['W5-3 step 3 and W4-1 step 7', '3', false], ['W4-1 step 3', undefined, true],
    ['W4-1 step 6 and step 8', '8', true], ['W4-1 steps 6 through 8', '7', true], ['W4-1 Rev C, step 6', '6', true], ['W4-1 Rev C, step 6', '7', false], ['W4-1 step six', '2', true], ['page W4-1 step 6a', '6', true], ['W4-1 step 6', '6a', true],
  ] as const)('the reference “%s” and step %s of W4-1', (reference, step, named) => {
    expect(namesPlace(reference, { page: 'W4-1', step })).toBe(named)
  })

  it('any page can be looked for, whatever characters it has', () => {
    fc.assert(fc.property(fc.string({ maxLength: 12 }), fc.string({ maxLength: 60 }), (page, reference) => {
      expect(typeof namesPlace(reference, { page, step: '3' })).toBe('boolean')
      expect(stepsNamed(reference)?.size ?? 0).toBeLessThanOrEqual(61 * 202)
    }))
  })
})

describe('a stamp and a bulletin', () => {
  it('a stamp from before the bulletin is plans changed, one from after it stands', () => {
    expect(stateOf()).toBe('plans-changed')
    expect(stateOf({ stamps: [stamp({ createdAt: 201 })] })).toBe('stamped')
    expect(stateOf({ stamps: [stamp(), stamp({ mentorId: 8, createdAt: 201 })] })).toBe('stamped')
  })

  it('a stamp pressed after the bulletin from an earlier revision of the page does not know it', () => {
    expect(stateOf({ stamps: [stamp({ createdAt: 201, plansRevision: 'C' })] })).toBe('plans-changed')
    expect(stateOf({ stamps: [stamp({ createdAt: 201, plansRevision: 'D' })] })).toBe('stamped')
    expect(stateOf({ stamps: [stamp({ createdAt: 201, plansRevision: 'AA' })] })).toBe('stamped')
    expect(stateOf({ stamps: [stamp({ createdAt: 201, plansRevision: '2024-05' })] })).toBe('stamped')
  })

  it('words for steps that are not understood mean the whole page', () => {
    for (const step of ['all', '6 through', 'the last one', '6 through 8']) expect(isSamePlace({ page: 'Page W4-1', step }, { page: 'W4-1', step: '7' })).toBe(true)
    expect(isSamePlace({ page: 'W4-1', step: '6 through 8' }, { page: 'W4-1', step: '9' })).toBe(false)
  })

  it('whatever the stamp stands on, when the post names the step; through a plans stamp also when only that names it', () => {
    expect(stateOf({ stamps: [stamp({ basis: 'own-build', reference: 'Mine' })] })).toBe('plans-changed')
    expect(stateOf({ plans: [] })).toBe('plans-changed')
    expect(stateOf({ plans: [], stamps: [stamp({ basis: 'standard', reference: 'W4-1 step 3' })] })).toBe('stamped')
    expect(stateOf({ plans: [], stamps: [stamp({ withdrawnAt: 150 }), stamp({ mentorId: 8, basis: 'own-build', reference: 'Mine' })] })).toBe('stamped')
  })

  it('on a critical system one new stamp is one of two again', () => {
    const before = [stamp(), stamp({ mentorId: 8, basis: 'own-build', reference: 'Mine' })]
    expect(judgeStamps(subject({ needsTwo: true, stamps: before }))).toMatchObject({ state: 'plans-changed', missing: 'first' })
    expect(judgeStamps(subject({ needsTwo: true, stamps: [...before, stamp({ mentorId: 9, createdAt: 300 })] }))).toMatchObject({ state: 'one-of-two', missing: 'second', changes: [] })
  })

  it('what graver states say is not covered by it, and an imported stamp is outdated too', () => {
    expect(stateOf({ postState: 'withdrawn' })).toBe('withdrawn')
    expect(stateOf({ currentRevision: 2 })).toBe('lapsed')
    expect(stateOf({ needsTwo: true, failuresAt: [150] })).toBe('in-question')
    const imported = stamp({ mentorId: null, basis: 'imported', reference: '' })
    expect([stateOf({ stamps: [imported] }), stateOf({ stamps: [{ ...imported, createdAt: 300 }] }), stateOf({ stamps: [] })]).toEqual(['plans-changed', 'imported', 'none'])
  })

  it('readers are told of the change until the text or a mentor has seen it', () => {
    const told = (over: Partial<StampSubject>) => judgeStamps(subject(over)).changes.map((c) => `${c.bulletin} ${c.page} ${c.step ?? ''} ${c.revision}`)
    expect(told({ stamps: [stamp({ createdAt: 201, plansRevision: 'C' })] })).toEqual(['SB-3 W4-1 3 D'])
    expect(told({ stamps: [] })).toEqual(['SB-3 W4-1 3 D'])
    expect(told({ stamps: [], revisedAt: 201 })).toEqual([])
    expect(told({ stamps: [stamp({ createdAt: 201 })] })).toEqual([])
    expect(told({ bulletins: [bulletin(), bulletin({ number: 'SB-4', enteredAt: 250, steps: [{ page: 'W4-1', revision: 'E' }] })] })).toEqual(['SB-4 W4-1  E', 'SB-3 W4-1 3 D'])
  })
})

const facts = fc.record({
  stamps: fc.array(fc.record({
    revision: fc.constantFrom(1, 2), questionRevision: fc.constant(0), mentorId: fc.constantFrom(1, 7, 8, 9), basis: fc.constantFrom('plans' as const, 'own-build' as const, 'standard' as const),
    scope: fc.constant(null), reference: fc.constantFrom('W4-1 step 3', 'W4-2', 'Mine'), createdAt: fc.integer({ min: 0, max: 20 }), withdrawnAt: fc.constantFrom(null, 15),
  }), { maxLength: 5 }),
  bulletins: fc.array(fc.record({
    number: fc.constantFrom('SB-1', 'SB-2', 'SB-3'), enteredAt: fc.integer({ min: 0, max: 20 }),
    steps: fc.array(fc.record({ page: fc.constantFrom('W4-1', 'w4-2', 'T1-1'), step: fc.constantFrom('3', '4', null), revision: fc.constantFrom('D', '') }), { minLength: 1, maxLength: 3 }),
  }), { maxLength: 4 }),
  plans: fc.array(fc.record({ page: fc.constantFrom('W4-1', 'W4-2'), step: fc.constantFrom('3', '4', undefined) }), { maxLength: 3 }),
  failuresAt: fc.array(fc.integer({ min: 0, max: 20 }), { maxLength: 2 }), needsTwo: fc.boolean(),
})

describe('of any facts', () => {
  it('their order does not matter', () => {
    fc.assert(fc.property(facts, (f) => {
      const turned = { ...f, stamps: [...f.stamps].reverse(), bulletins: [...f.bulletins].reverse().map((b) => ({ ...b, steps: [...b.steps].reverse() })), plans: [...f.plans].reverse(), failuresAt: [...f.failuresAt].reverse() }
      const [a, b] = [judgeStamps(subject(f)), judgeStamps(subject(turned))]
      expect({ ...b, changes: [...b.changes].map((c) => JSON.stringify(c)).sort() }).toEqual({ ...a, changes: [...a.changes].map((c) => JSON.stringify(c)).sort() })
    }))
  })

  it('a bulletin never makes a post better stamped, and a new bulletin on its step leaves none stamped', () => {
    fc.assert(fc.property(facts, (f) => {
      const before = judgeStamps(subject({ ...f, bulletins: [] })).state
      const after = judgeStamps(subject(f)).state
      if (after === 'stamped') expect(before).toBe('stamped')
      const late = judgeStamps(subject({ ...f, plans: [{ page: 'W4-1', step: '3' }], bulletins: [...f.bulletins, bulletin({ enteredAt: 99 })] })).state
      expect(['stamped', 'one-of-two']).not.toContain(late)
    }))
  })
})
