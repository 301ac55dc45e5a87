// The mentors' rail: what hangs there, why, and in which order.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { nextOnRail, orderRail, railReason, type RailFact } from '@/lib/domain/desk/order-rail'
import { stampStates } from '@/lib/domain/stamps/stamp-state'

const aFact = (over: Partial<RailFact> = {}): RailFact => ({
  postId: 1, entryId: 1, kind: 'answer', stampState: 'none', needsTwo: false, worstWord: null, goingBy: 0, createdAt: 1_000, answers: 0,
  isOwn: false, isStampedByMe: false, isAskedFor: false, isForOneSerial: false, isByGoneMentor: false, ...over,
})
const ids = (facts: RailFact[]) => orderRail(facts).map((t) => t.fact.postId)

describe('what hangs on the rail', () => {
  it.each([
    ['none', 'first'], ['imported', 'first'], ['withdrawn', 'first'], ['one-of-two', 'second'], ['lapsed', 'lapsed'], ['plans-changed', 'plans-changed'], ['in-question', 'in-question'], ['stamped', null],
  ] as const)('advice in state %s hangs for: %s', (stampState, reason) => {
    expect(railReason(aFact({ stampState }))).toBe(reason)
    expect(railReason(aFact({ stampState, kind: 'lesson' }))).toBe(reason)
  })

  it('a question hangs while nobody has said what to do', () => {
    expect(railReason(aFact({ kind: 'question', answers: 0 }))).toBe('open-question')
    expect(railReason(aFact({ kind: 'question', answers: 1 }))).toBeNull()
  })

  it('nothing hangs before the one who wrote it', () => {
    for (const stampState of stampStates) expect(railReason(aFact({ stampState, isOwn: true }))).toBeNull()
    expect(railReason(aFact({ kind: 'question', isOwn: true }))).toBeNull()
  })

  it('what a mentor stamped leaves their rail, until it is in question', () => {
    expect(railReason(aFact({ stampState: 'one-of-two', isStampedByMe: true }))).toBeNull()
    expect(railReason(aFact({ stampState: 'in-question', isStampedByMe: true }))).toBe('in-question')
  })

  it('what its author was asked for is off the rail until answered', () => {
    expect(railReason(aFact({ stampState: 'in-question', isAskedFor: true }))).toBeNull()
    expect(railReason(aFact({ kind: 'question', isAskedFor: true }))).toBeNull()
  })

  it('a maker’s reply for one serial never hangs', () => {
    expect(railReason(aFact({ isForOneSerial: true }))).toBeNull()
  })

  it('a stamp of a suspended mentor stands, and is looked at again by another', () => {
    expect(railReason(aFact({ stampState: 'stamped', isByGoneMentor: true }))).toBe('mentor-gone')
    expect(railReason(aFact({ stampState: 'stamped', isByGoneMentor: true, isStampedByMe: true }))).toBeNull()
  })
})

describe('the order of the rail', () => {
  it('puts what can hurt first: in question, critical systems, then WARNING, CAUTION, NOTICE, nothing', () => {
    const facts = [
      aFact({ postId: 1 }), aFact({ postId: 2, worstWord: 'NOTICE' }), aFact({ postId: 3, worstWord: 'CAUTION' }), aFact({ postId: 4, worstWord: 'WARNING' }),
      aFact({ postId: 5, worstWord: 'WARNING', needsTwo: true }), aFact({ postId: 6, stampState: 'in-question', worstWord: 'WARNING', needsTwo: true }),
    ]
    expect(ids(facts)).toEqual([6, 5, 4, 3, 2, 1])
  })

  it('then what more builders go by, then the oldest', () => {
    expect(ids([
      aFact({ postId: 1, goingBy: 2, createdAt: 5 }), aFact({ postId: 2, goingBy: 9, createdAt: 9 }), aFact({ postId: 3, goingBy: 2, createdAt: 3 }),
    ])).toEqual([2, 3, 1])
  })

  it('a harmless post that many go by stays behind a critical one that nobody does', () => {
    expect(ids([aFact({ postId: 1, goingBy: 500 }), aFact({ postId: 2, needsTwo: true, worstWord: 'WARNING' })])).toEqual([2, 1])
  })

  it('does not depend on the order in which the facts come', () => {
    const fact = fc.record({ goingBy: fc.nat(3), createdAt: fc.nat(3), needsTwo: fc.boolean(), stampState: fc.constantFrom(...stampStates), worstWord: fc.constantFrom(null, 'NOTICE' as const, 'CAUTION' as const, 'WARNING' as const) })
    fc.assert(fc.property(fc.array(fact, { maxLength: 12 }).chain((list) => {
      const facts = list.map((over, i) => aFact({ ...over, postId: i + 1 }))
      return fc.tuple(fc.constant(facts), fc.shuffledSubarray(facts, { minLength: facts.length }))
    }), ([facts, shuffled]) => {
      expect(ids(shuffled)).toEqual(ids(facts))
    }))
  })
})

describe('the next tag', () => {
  const tags = orderRail([aFact({ postId: 1, createdAt: 1 }), aFact({ postId: 2, createdAt: 2 }), aFact({ postId: 3, createdAt: 3 })])
  it('is the one behind it; after the last, the first', () => {
    expect([nextOnRail(tags, 1), nextOnRail(tags, 2), nextOnRail(tags, 3)]).toEqual([2, 3, 1])
  })
  it('is the first for a sheet that does not hang, and none when nothing else hangs', () => {
    expect(nextOnRail(tags, 99)).toBe(1)
    expect(nextOnRail(tags.slice(0, 1), 1)).toBeNull()
    expect(nextOnRail([], 1)).toBeNull()
  })
})
