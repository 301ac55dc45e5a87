// Where the lines of an order strip run.
import { describe, expect, it } from 'vitest'
import { layStrip } from '@/lib/domain/order/lay-strip'

const line = (before: string, after: string) => ({ before, after, builders: 1 })
const lanes = (tasks: string, ...lines: [string, string][]) => layStrip(tasks.split(''), lines.map(([b, a]) => line(b, a))).map((row) => row.lanes)

describe('an order strip', () => {
  it('has a row a task and no lane without departures', () => {
    expect(layStrip(['a', 'b'], [])).toEqual([{ task: 'a', lanes: [] }, { task: 'b', lanes: [] }])
  })

  it('draws a departure from its first task through those between to its last', () => {
    expect(lanes('abc', ['a', 'c'])).toEqual([['start'], ['through'], ['end']])
  })

  it('gives departures that overlap a lane each, the shorter one nearer to the base line', () => {
    expect(lanes('abcd', ['a', 'd'], ['b', 'c'])).toEqual([['none', 'start'], ['start', 'through'], ['end', 'through'], ['none', 'end']])
  })

  it('lets departures that don’t meet share a lane', () => {
    expect(lanes('abcd', ['a', 'b'], ['c', 'd'])).toEqual([['start'], ['end'], ['start'], ['end']])
    expect(lanes('abc', ['a', 'b'], ['b', 'c'])[1]).toEqual(['end', 'start'])
  })

  it('leaves out what this order does not follow', () => {
    expect(lanes('ab', ['b', 'a'], ['a', 'z'], ['a', 'a'])).toEqual([[], []])
  })
})
