// Lessons that say the same, by the words they share.
import { describe, expect, it } from 'vitest'
import { groupAlike, sharedWords, type Alike } from '@/lib/domain/briefs/group-alike'

let id = 0
const lesson = (title: string, text: string, builder: string, advice: string[] = []): Alike => ({ id: ++id, title, text, builder, advice })
const edges = lesson('Deburr the rib edges before you flute', 'Deburr the flange edges while they are straight, then flute.', 'member:1')
const again = lesson('Flute the ribs only when the edges are deburred', 'Deburr the edges of each flange first while straight, flute after.', 'member:2')
const primer = lesson('Prime only what closes up', 'Contact faces and the inside of the spar. Mask the dimples to come.', 'member:3')

describe('lessons that say the same', () => {
  it('stand together under the first, with how many builders', () => {
    const [first, second] = groupAlike([edges, primer, again])
    expect(first).toMatchObject({ lead: { id: edges.id }, builders: 2 })
    expect(first?.others.map((o) => o.id)).toEqual([again.id])
    expect(second).toMatchObject({ lead: { id: primer.id }, builders: 1, others: [] })
  })

  it('count one builder once, however often they say it', () => {
    expect(groupAlike([edges, { ...again, builder: 'member:1' }])[0]?.builders).toBe(1)
  })

  it('are one group when each is like another of it, in whatever order they come', () => {
    const between = { ...edges, id: ++id, title: `${edges.title} ${primer.title}`, text: `${edges.text} ${primer.text}` }
    expect(groupAlike([edges, primer, between])).toHaveLength(1)
    expect(groupAlike([between, edges, primer])).toHaveLength(1)
  })

  it('need fewer of the same words where they give the same order', () => {
    const [one, other] = [lesson('Files skate on fluted flanges', 'Deburr edges first, then flute. Carpet under the clamp, handle on the file.', 'a'), lesson('A cup of tea between ribs', 'Edges come first, flute after. One slip scratched the web and took half a morning.', 'b')]
    expect(groupAlike([one, other])).toHaveLength(2)
    expect(groupAlike([{ ...one, advice: ['deburr-edges flute'] }, { ...other, advice: ['deburr-edges flute'] }])).toHaveLength(1)
  })

  it('are not found in two or three words', () => {
    expect(groupAlike([lesson('Ribs', 'Ribs.', 'a'), lesson('Ribs', 'Ribs.', 'b')])).toHaveLength(2)
  })
})

// Salton & McGill, Introduction to Modern Information Retrieval (1983): cosine of binary vectors = shared / sqrt(a × b).
it('the share of common words is the cosine of the two sets', () => {
  expect(sharedWords(new Set(['a', 'b', 'c', 'd']), new Set(['c', 'd', 'e', 'f']))).toBeCloseTo(0.5, 12)
  expect(sharedWords(new Set(['a', 'b', 'c', 'd']), new Set(['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h', 'i']))).toBeCloseTo(4 / 6, 12)
})
