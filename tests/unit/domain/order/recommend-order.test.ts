// The order of tasks against graphs with published answers (figures as remembered, not checked against the books) and against what must hold of any graph.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findDisagreements } from '@/lib/domain/order/find-disagreements'
import { recommendOrder } from '@/lib/domain/order/recommend-order'
import { weighAdvice, type Advice, type Voice } from '@/lib/domain/order/weigh-advice'

const advice = (before: string, after: string, builders = 1): Advice => ({ before, after, builders, postIds: [] })
const pairs = (text: string): Advice[] => text.split(' ').map((pair) => advice(pair[0] ?? '', pair[1] ?? ''))
const isValid = (order: readonly string[], followed: readonly Advice[]) => followed.every(({ before, after }) => order.indexOf(before) < order.indexOf(after))

describe('graphs with published answers', () => {
  it('Cormen, Leiserson, Rivest, Stein, Introduction to Algorithms, 3rd ed. (2009), figure 22.7: getting dressed', () => {
    const dressing = [
      ['undershorts', 'pants'], ['undershorts', 'shoes'], ['pants', 'belt'], ['pants', 'shoes'], ['belt', 'jacket'],
      ['shirt', 'belt'], ['shirt', 'tie'], ['tie', 'jacket'], ['socks', 'shoes'],
    ].map(([before = '', after = '']) => advice(before, after))
    // The book's own order as the base line: it is valid, so nothing may move.
    const book = ['socks', 'undershorts', 'pants', 'shoes', 'watch', 'shirt', 'belt', 'tie', 'jacket']
    expect(recommendOrder(book, dressing)).toEqual({ order: book, departures: [], disagreements: [] })
    expect(isValid(recommendOrder([...book].reverse(), dressing).order, dressing)).toBe(true)
  })

  it('A. B. Kahn, "Topological sorting of large networks", CACM 5 (1962): a loop is found and its tasks are named', () => {
    // From memory, not checked against the paper: its point is that what cannot be sorted is reported. The ring is the smallest there is.
    const { disagreements } = recommendOrder([], pairs('ab bc ca cd'))
    expect(disagreements.map(({ kind, tasks }) => ({ kind, tasks }))).toEqual([{ kind: 'ring', tasks: ['a', 'b', 'c'] }])
  })

  it('R. Tarjan, "Depth-first search and linear graph algorithms" (1972): strongly connected parts, as CLRS figure 22.9 has them', () => {
    const figure = pairs('ab bc be bf cd cg dc dh ea ef fg gf gh hh').filter(({ before, after }) => before !== after)
    const { disagreements } = findDisagreements(figure)
    // {a, b, e} is a ring; {c, d} and {f, g} are tasks both ways; h stands alone.
    expect(disagreements.map(({ kind, tasks }) => `${kind}: ${tasks.join('')}`)).toEqual(['both-ways: cd', 'both-ways: fg', 'ring: abe'])
  })
})

describe('a section', () => {
  const plans = ['match-drill', 'flute', 'deburr-edges', 'dimple', 'prime', 'rivet']

  it('without advice keeps the plans’ own order', () => {
    expect(recommendOrder(plans, [])).toEqual({ order: plans, departures: [], disagreements: [] })
  })

  it('takes a task forward to just before the one that needs it, and says how many builders depart', () => {
    const { order, departures } = recommendOrder(plans, [advice('deburr-edges', 'flute', 4)])
    expect(order).toEqual(['match-drill', 'deburr-edges', 'flute', 'dimple', 'prime', 'rivet'])
    expect(departures).toEqual([{ advice: { before: 'deburr-edges', after: 'flute', builders: 4, postIds: [] } }])
  })

  it('names both sides of a disagreement and follows the more', () => {
    const [one, other] = [advice('dimple', 'prime', 1), advice('prime', 'dimple', 3)]
    const { order, disagreements } = recommendOrder(plans, [one, other])
    expect(order.indexOf('prime')).toBeLessThan(order.indexOf('dimple'))
    expect(disagreements).toEqual([{ kind: 'both-ways', tasks: ['dimple', 'prime'], advice: [one, other], followed: other }])
  })

  it('with as many on both sides follows the plans', () => {
    const { order, disagreements } = recommendOrder(plans, [advice('dimple', 'prime', 2), advice('prime', 'dimple', 2)])
    expect(order).toEqual(plans)
    expect(disagreements[0]?.followed).toBeNull()
  })

  it('puts a task that only builders name where it is needed', () => {
    expect(recommendOrder(plans, [advice('scrub', 'prime')]).order).toEqual(['match-drill', 'flute', 'deburr-edges', 'dimple', 'scrub', 'prime', 'rivet'])
  })
})

describe('voices', () => {
  const voice = (builder: string, before: string, after: string, at: number, postId: number | null = null): Voice => ({ builder, before, after, at, postId })

  it('count one a builder, and their newest', () => {
    expect(weighAdvice([voice('ann', 'a', 'b', 1, 7), voice('ann', 'a', 'b', 2, 8), voice('ann', 'b', 'a', 3, 9), voice('ben', 'b', 'a', 1, 4)]))
      .toEqual([{ before: 'b', after: 'a', builders: 2, postIds: [4, 9] }])
  })

  it('are weighed the same in whatever order they come', () => {
    const some = fc.array(fc.record({ builder: fc.constantFrom('ann', 'ben', 'cas'), before: fc.constantFrom('a', 'b', 'c'), after: fc.constantFrom('a', 'b', 'c'), at: fc.integer({ min: 0, max: 3 }), postId: fc.integer({ min: 1, max: 3 }) }))
    fc.assert(fc.property(some, (voices) => {
      expect(weighAdvice([...voices].reverse())).toEqual(weighAdvice(voices))
    }))
  })
})

describe('any graph', () => {
  const tasks = 'abcdefgh'.split('')
  const anyAdvice = fc.uniqueArray(fc.tuple(fc.constantFrom(...tasks), fc.constantFrom(...tasks)).filter(([a, b]) => a !== b), { maxLength: 24, selector: (pair) => pair.join('') })
    .map((list) => list.map(([before, after]) => advice(before, after, 1 + ((before.charCodeAt(0) * 7 + after.charCodeAt(0)) % 3))))
  const anyBase = fc.shuffledSubarray(tasks)

  it('gives every task once, valid for all advice that is followed', () => {
    fc.assert(fc.property(anyBase, anyAdvice, (base, said) => {
      const { order } = recommendOrder(base, said)
      expect([...order].sort()).toEqual([...new Set([...base, ...said.flatMap((a) => [a.before, a.after])])].sort())
      expect(isValid(order, findDisagreements(said).followed)).toBe(true)
    }))
  })

  it('follows all advice when there is no ring', () => {
    fc.assert(fc.property(anyBase, anyAdvice, (base, said) => {
      // Every pair turned the way of the alphabet: no ring is possible.
      const acyclic = [...new Map(said.map((a) => [[a.before, a.after].sort().join(''), advice(...([a.before, a.after].sort() as [string, string]))])).values()]
      const { order, disagreements } = recommendOrder(base, acyclic)
      expect(disagreements).toEqual([])
      expect(isValid(order, acyclic)).toBe(true)
    }))
  })

  it('reports only rings that are rings, and leaves none unreported', () => {
    fc.assert(fc.property(anyAdvice, (said) => {
      const { disagreements, followed } = findDisagreements(said)
      for (const { kind, tasks: ring, advice: within } of disagreements) {
        expect(ring.length).toBeGreaterThan(kind === 'ring' ? 2 : 1)
        ring.forEach((task, i) => expect(within.some((a) => a.before === task && a.after === ring[(i + 1) % ring.length])).toBe(true))
      }
      expect(isValid(recommendOrder([], followed).order, followed)).toBe(true)
      for (const one of said) expect(followed.includes(one) || disagreements.some((d) => d.advice.includes(one))).toBe(true)
    }))
  })

  it('is the same in whatever order the advice comes', () => {
    fc.assert(fc.property(anyBase, anyAdvice, (base, said) => {
      expect(recommendOrder(base, [...said].reverse())).toEqual(recommendOrder(base, said))
    }))
  })
})
