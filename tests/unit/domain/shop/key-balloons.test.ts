// Which balloon of a figure a post is about: by the feature's words near the part, and never by the part alone.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { BALLOON_WORDS } from '@/lib/domain/shop/balloon-words'
import { tableFigures } from '@/lib/domain/shop/figures/table-figures'
import { keyBalloons } from '@/lib/domain/shop/key-balloons'
import { readShopQuery } from '@/lib/domain/shop/read-query'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'

function keysOf(query: string) {
  const [reading] = readShopQuery(query)
  const outcome = reading ? shopTable(reading.table)?.compute(reading.inputs) : undefined
  if (!reading || !outcome?.ok) throw new Error(query)
  const balloons = tableFigures(reading.table, outcome.inputs, outcome.results, 640).flatMap((figure) => figure.balloons)
  const keys = keyBalloons(reading.table, balloons, outcome.results)
  return { names: (title: string, passage = '') => (keys?.(title, passage) ?? []).map((n) => balloons.find((b) => b.n === n)?.label), keys }
}

describe('a post under a computed answer', () => {
  it.each([
    ['grommet hole 3/8', 'The groove sits in the hole', 'The grommet would not seat.', ['Groove']],
    ['grommet hole 3/8', 'What hole for the grommet?', 'I stepped it up to 5/8 and it seated.', ['Groove']],
    ['grommet hole 3/8', 'Grommet works out of the cabin floor', 'It is where the brake line passes.', ['Wire']],
    ['grommet hole 3/8', 'Prime first, then grommets', 'Wet primer on the cut edge lets it turn.', ['Cut edge']],
    ['drill for 1/8 rivet', 'Rib flange', 'The rivet there has an edge distance of 7/32.', ['Least edge']],
    ['drill for 1/8 rivet', 'Bucktail leans over', 'Every third one.', ['Shop head']],
    ['drill for 1/8 rivet', 'Final size', 'Rivets: I use .1285 for these.', ['Hole']],
    ['AN3 torque', 'Prevailing drag of lock nuts', 'Add it.', ['Nut']],
    ['AN3-5A grip', 'Bolt bottoms out', 'Two washers under the nut of that bolt.', ['Washers']],
    ['#30', 'Which bit', 'Open it with a #30.', ['#30']],
  ])('%s: %s', (query, title, passage, labels) => {
    expect(keysOf(query).names(title, passage)).toEqual(labels)
  })

  it.each([
    ['the part alone', 'grommet hole 3/8', 'Grommets in the rib', 'Nylon or rubber ones?'],
    ['the feature without the part', 'grommet hole 3/8', 'Deburr the flange', 'A bore gauge helps.'],
    ['the feature far from the part', 'grommet hole 3/8', 'Ribs', `A grommet. ${'Rib after rib was fitted. '.repeat(10)} The groove of the pulley was worn.`],
    ['the size that was asked for', 'grommet hole 3/8', 'Grommet beside a 3/8 bolt', ''],
    ['a longer number that holds the value', 'grommet hole 3/8', 'Grommet 15/8 and 5/80', '0.6251 or 5.625'],
    ['another drill', '#30', 'Drills #300 and #3', 'at 30 degrees'],
  ])('is not keyed by %s', (_what, query, title, passage) => {
    expect(keysOf(query).names(title, passage)).toEqual([])
  })

  it('is keyed to what it says most about first, and to two features at most', () => {
    expect(keysOf('grommet hole 3/8').names('Grommet groove and bore', 'Deburr; wires; groove.')).toEqual(['Groove', 'Bore'])
  })
})

it('the words name balloons that some figure of their table has', () => {
  for (const [slug, { features }] of Object.entries(BALLOON_WORDS)) {
    const outcome = SHOP_TABLES.find((table) => table.slug === slug)?.compute({})
    if (!outcome?.ok) throw new Error(slug)
    const labels = tableFigures(slug, outcome.inputs, outcome.results, 640).flatMap((figure) => figure.balloons.map((balloon) => balloon.label))
    expect(labels, slug).toEqual(expect.arrayContaining(Object.keys(features)))
  }
})

it('reads any text without throwing, and numbers only balloons there are', () => {
  const { keys } = keysOf('grommet hole 3/8')
  fc.assert(fc.property(fc.string({ maxLength: 2000 }), (text) => { for (const n of keys?.(text, text) ?? []) expect([1, 2, 3, 4]).toContain(n) }))
})
