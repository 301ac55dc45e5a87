// Hours, tools, passages and what fits on paper.
import { describe, expect, it } from 'vitest'
import { countTools } from '@/lib/domain/briefs/count-tools'
import { describeHours } from '@/lib/domain/briefs/describe-hours'
import { linesOf, takeLines } from '@/lib/domain/briefs/fit-print'
import { passageOf } from '@/lib/domain/briefs/passage-of'

const told = (...hours: number[]) => hours.map((h, i) => ({ builder: `member:${i}`, hours: h, at: i }))

describe('hours', () => {
  it('of fewer than three builders are not shown, since two would know each other', () => {
    expect(describeHours(told(10, 20))).toBeNull()
    expect(describeHours([...told(10, 20), { builder: 'member:0', hours: 30, at: 9 }])).toBeNull()
    expect(describeHours(told(10, 20, 30))).not.toBeNull()
  })

  // NIST/SEMATECH e-Handbook of Statistical Methods, 7.2.6.2: place p(N + 1). Of 1 to 11: places 3, 6 and 9.
  it('are described by the quartiles of one value a builder', () => {
    expect(describeHours(told(11, 10, 9, 8, 7, 6, 5, 4, 3, 2, 1))).toEqual({ builders: 11, lower: 3, median: 6, upper: 9, least: 1, most: 11, points: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11] })
  })

  it('show every point under twelve builders and none from twelve on', () => {
    expect(describeHours(told(1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11))?.points).toHaveLength(11)
    expect(describeHours(told(1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12))?.points).toBeNull()
  })

  it('of a builder who told them twice are the most they told', () => {
    expect(describeHours([...told(4, 6, 8), { builder: 'member:0', hours: 5, at: 9 }, { builder: 'member:0', hours: 2, at: 10 }])?.points).toEqual([5, 6, 8])
  })

  it('that are no hours count for nobody', () => {
    expect(describeHours(told(0, -3, Number.NaN, 4, 6, 8))?.points).toEqual([4, 6, 8])
  })
})

describe('tools', () => {
  const tools = (...texts: string[]) => countTools(texts.map((text, i) => ({ builder: `member:${i}`, text, postId: i + 1 }))).map((t) => [t.name, t.builders])
  it('are counted by builder under their shortest name', () => {
    expect(tools('Fluting pliers with jaws polished by me, loupe.', 'Fine file, fluting pliers', 'fluting pliers; fluting pliers')).toEqual([['Fluting pliers', 3], ['Fine file', 1], ['Loupe', 1]])
  })
  it('of one word don’t swallow longer names', () => {
    expect(tools('Tape', 'masking tape').map(([name]) => name)).toEqual(['Masking tape', 'Tape'])
  })
  it('come without brackets and Markdown', () => {
    expect(tools('Long file with a handle (*with a handle*), **carpet**')).toEqual([['Carpet', 1], ['Long file with a handle', 1]])
  })
  it('know which posts name them', () => {
    expect(countTools([{ builder: 'a', text: 'Loupe', postId: 7 }, { builder: 'b', text: 'loupe', postId: 3 }, { builder: 'c', text: 'loupe', postId: null }])).toEqual([{ name: 'Loupe', builders: 3, postIds: [3, 7] }])
  })
})

describe('the passage of a lesson', () => {
  const parts = { happened: 'It **went** wrong.', differently: '- Edges *first*, then flute', tools: 'A file.' }
  it('is what its builder would do differently, from the rendered text', () => {
    expect(passageOf('It went wrong.\n\nEdges first, then flute\n\nA file.', parts)).toBe('Edges first, then flute')
  })
  it('is its beginning where it has no such part, or none that is found', () => {
    expect(passageOf('It went wrong.', { happened: 'It went wrong.' })).toBe('It went wrong.')
    expect(passageOf('It went wrong.', { differently: '(.*)+ never here' })).toBe('It went wrong.')
    expect(passageOf('Stop and ask.', null)).toBe('Stop and ask.')
  })
  it('of a long text ends at a word', () => {
    const passage = passageOf('word '.repeat(200), null)
    expect(passage.length).toBeLessThanOrEqual(240)
    expect(passage).toMatch(/word…$/u)
  })
})

describe('what fits on paper', () => {
  it('is taken in order until one does not fit, and the rest is counted', () => {
    expect(takeLines([2, 2, 5, 1], 6, (n) => n)).toEqual({ taken: [2, 2], leftOut: 2, room: 2 })
    expect(takeLines([], 6, () => 1)).toEqual({ taken: [], leftOut: 0, room: 6 })
  })
  it('is measured in lines', () => {
    expect([linesOf(''), linesOf('a'), linesOf('a'.repeat(112)), linesOf('a'.repeat(113)), linesOf('a', 1)]).toEqual([0, 1, 1, 2, 2])
  })
})
