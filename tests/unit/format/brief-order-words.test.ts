// The order of tasks in words.
import { describe, expect, it } from 'vitest'
import { departureWords, followedWords, originWords, sideWords, stepWords } from '@/lib/format/brief-order-words'
import type { Brief, Said } from '@/lib/schemas/brief'

const said = (before: string, after: string, builders: number): Said => ({ before: { slug: before, title: `${before} parts` }, after: { slug: after, title: `${after} ribs` }, builders, posts: [] })
const order = (o: Partial<Brief['order']> = {}): Brief['order'] => ({ tasks: [], hasBaseLine: true, builders: 4, ownBuilders: 4, otherKits: [], departures: [], disagreements: [], straightOn: [], ...o })

describe('the order in words', () => {
  it('names a step, and how many more places a task has', () => {
    expect(stepWords([{ page: 'W3-2', step: '6' }])).toBe('W3-2 · step 6')
    expect(stepWords([{ page: 'W3-2', step: '6' }, { page: 'W3-3', step: '1' }])).toBe('W3-2 · step 6 and 1 more')
    expect(stepWords([])).toBeNull()
  })

  it('says who departs from the plans', () => {
    expect(departureWords(said('prime', 'dimple', 1))).toBe('1 builder does this before “dimple ribs”, where the plans have it after.')
    expect(departureWords(said('prime', 'dimple', 3))).toMatch(/^3 builders do this/u)
  })

  it('names each side of a disagreement and which the page follows', () => {
    const [more, fewer] = [said('prime', 'dimple', 3), said('dimple', 'prime', 2)]
    expect(sideWords(more)).toBe('3 prime parts, then dimple ribs')
    const both = { kind: 'both-ways' as const, tasks: [], sides: [more, fewer] }
    expect(followedWords({ ...both, followed: { before: 'prime', after: 'dimple' } })).toBe('This page follows the 3: prime parts, then dimple ribs.')
    expect(followedWords({ ...both, followed: null })).toMatch(/follows neither/u)
    expect(followedWords({ ...both, kind: 'ring', followed: null })).toMatch(/ring.*follows none/u)
  })

  it('says from whom it is, and names other kits that were asked', () => {
    expect(originWords(order())).toBe('Order from 4 builders of this section, over the plans’ own steps.')
    const words = originWords(order({ ownBuilders: 1, builders: 2, hasBaseLine: false, otherKits: [{ kit: 'Ouzel 3', section: '31', title: 'Wing ribs and skins', builders: 1 }] }))
    expect(words).toContain('1 builder of Ouzel 3 31 Wing ribs and skins is counted too (same system)')
    expect(words).toContain('the plans’ steps are not entered here')
    expect(originWords(order({ ownBuilders: 0, builders: 0 }))).toMatch(/^No builder has said/u)
  })
})
