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
  ])('%s', (text, expected) => {
    expect(first(text)).toEqual(expected)
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
