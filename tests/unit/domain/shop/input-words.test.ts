// Inputs in words and as a link, and which result leads.
import { describe, expect, it } from 'vitest'
import { linkInputs, readAs } from '@/lib/domain/shop/input-words'
import { leadResults } from '@/lib/domain/shop/lead-results'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import type { ShopTable } from '@/lib/domain/shop/shop-table'

function table(slug: string): ShopTable {
  const found = shopTable(slug)
  if (!found) throw new Error(slug)
  return found
}
function computed(slug: string, raw: Record<string, string> = {}) {
  const outcome = table(slug).compute(raw)
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.errors))
  return outcome
}

describe('What was understood', () => {
  it('names inputs with their units, choices by their labels', () => {
    expect(readAs(table('grommet'), computed('grommet', { bore: '9.525 mm' }).inputs)).toBe('Grommet holes: bore, the side of the wire 3/8 in')
    expect(readAs(table('torque'), computed('torque', { thread: 'AN4', drag: '1.13 N·m' }).inputs)).toMatch(/^Torque: thread 1\/4-28 \(AN4\) · nut Tension: MS20365, AN310 · drag of the nut, measured 10 in-lb/)
  })
})

describe('A permanent link', () => {
  it('holds what was sent and what was assumed, so that it keeps its answer', () => {
    expect(linkInputs(table('grommet'), { groove: ' 5/8 ' })).toEqual({ bore: '3/8', groove: '5/8' })
    expect(linkInputs(table('rivet'), { edge: '' })).not.toHaveProperty('edge')
  })

  it.each(SHOP_TABLES.map(({ slug }) => slug))('of %s computes the same again', (slug) => {
    expect(computed(slug, linkInputs(table(slug), {}))).toEqual(computed(slug))
  })
})

describe('The leading result', () => {
  const lead = (slug: string, raw: Record<string, string> = {}) => leadResults(slug, computed(slug, raw).results).map(({ name, display }) => [name, display.inch])

  it('is the number one came for', () => {
    expect(lead('grommet', { bore: '3/8' })).toEqual([['hole', '5/8 in']])
    expect(lead('torque', { thread: '10-32' })).toEqual([['torque', '20 to 25 in-lb']])
    expect(lead('drills', { size: '#30' })).toEqual([['drill', '#30 · 0.1285 in']])
  })

  it('is the measured groove where one was measured', () => {
    expect(lead('grommet', { bore: '3/8', groove: '0.61' })).toEqual([['hole-groove', '0.610 in']])
  })

  it('is what fits the hole that is there, and plainly nothing where the list has none', () => {
    expect(lead('grommet', { hole: '5/8' })).toEqual([['for-hole', 'AN931-6-10']])
    expect(lead('grommet', { hole: '3/8' })).toEqual([['for-hole', 'no value']])
  })

  it('is the nearest drill where none has the diameter', () => {
    expect(lead('drills', { size: '0.13' })).toEqual([['nearest', '#30 · 0.1285 in']])
  })

  it('is every source of it, never one alone', () => {
    expect(lead('bend').length).toBe(3)
    expect(leadResults('bend', [])).toEqual([])
  })
})
