// Which shop table a search is about.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readShopQuery } from '@/lib/domain/shop/read-query'
import { shopTable } from '@/lib/domain/shop/shop-tables'

const first = (text: string) => { const [r] = readShopQuery(text); return r ? { table: r.table, ...r.inputs } : null }

describe('a query that asks for a number', () => {
  it.each([
    ['grommet hole 3/8', { table: 'grommet', bore: '3/8' }], ['AN931-6-10 hole', { table: 'grommet', part: 'AN931-6-10' }],
    ['drill for 1/8 rivet', { table: 'rivet', diameter: '1/8', head: 'universal' }], ['hole for AN426AD3-4', { table: 'rivet', diameter: '3/32', head: 'flush' }],
    ['AN3 torque', { table: 'torque', thread: '10-32' }], ['torque 1/4-28', { table: 'torque', thread: '1/4-28' }],
    ['AN3-5A grip', { table: 'bolt', bolt: 'AN3', part: 'AN3-5A' }], ['#30', { table: 'drills', size: '#30' }],
    ['clearance hole #8 screw', { table: 'drills', screw: '#8', size: '#19' }], ['hole for 10-32 screw', { table: 'drills', screw: '#10', size: '#11' }],
    ['grommet for 3/8 conduit', { table: 'grommet', bore: '3/8', through: '3/8' }],
  ])('%s', (text, expected) => {
    expect(first(text)).toEqual(expected)
  })

  it('offers flush and blind where nobody said which rivet, and nothing else where somebody did', () => {
    expect(readShopQuery('drill for 1/8 rivet').map((r) => r.inputs.head)).toEqual(['universal', 'flush', 'blind'])
    expect(readShopQuery('1/8 flush rivet').map((r) => r.inputs.head)).toEqual(['flush'])
  })

  it('takes a screw’s number for no drill, and a tapped hole for none of its tables', () => {
    expect(readShopQuery('drill for #8 screw').map((r) => r.label)).toEqual(['a hole that passes a #8 screw'])
    expect(readShopQuery('tap drill for 8-32 screw')).toEqual([])
    expect(readShopQuery('drill holes for 2 #8 screws').map((r) => r.label)).toEqual(['a hole that passes a #8 screw'])
    for (const other of ['clearance hole for 4 mm screw', 'W3-2 step 6 screw hole']) expect(readShopQuery(other).map((r) => r.label).join()).not.toContain('screw')
  })

  it('offers the other reading of a grommet size', () => {
    expect(readShopQuery('grommet 3/8').map((r) => r.inputs)).toEqual([{ bore: '3/8' }, { hole: '3/8' }])
  })
})

it.each(['grommet hole size', 'torque after snugging', 'rivet pulled crooked', 'W3-2 step 6', 'canopy latch', ''])('%s asks for none', (text) => {
  expect(readShopQuery(text)).toEqual([])
})

it('never throws, and every reading is one its table can answer or refuse in words', () => {
  fc.assert(fc.property(fc.string({ maxLength: 400 }), (text) => {
    for (const { table, inputs } of readShopQuery(text)) expect(typeof shopTable(table)?.compute(inputs).ok).toBe('boolean')
  }))
})
