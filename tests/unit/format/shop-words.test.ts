// How a shop result reads beside its number.
import { describe, expect, it } from 'vitest'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import { groupReadings } from '@/lib/format/group-readings'
import { basisWords, bigNumber, inputHelp, noteWords, sourceWords, valueWords } from '@/lib/format/shop-words'
import type { ShopAnswerResult } from '@/lib/schemas/shop'

function resultsOf(slug: string, raw: Record<string, string> = {}): ShopAnswerResult[] {
  const outcome = shopTable(slug)?.compute(raw)
  if (!outcome?.ok) throw new Error(slug)
  return outcome.results.map((result) => ({ ...result, label: result.name }))
}
function named(slug: string, name: string, raw: Record<string, string> = {}): ShopAnswerResult {
  const result = resultsOf(slug, raw).find((each) => each.name === name)
  if (!result) throw new Error(name)
  return result
}

describe('The large number', () => {
  it.each([
    ['grommet', 'hole', 'inch', { number: '5/8', unit: 'in', also: '0.625 in · 15.88 mm' }],
    ['grommet', 'hole', 'metric', { number: '15.88', unit: 'mm', also: '5/8 in' }],
    ['torque', 'torque', 'inch', { number: '20–25', unit: 'in-lb', also: '2.26 to 2.82 N·m' }],
    ['rivet', 'hole', 'inch', { number: '#30', unit: '', also: '0.1285 in · 3.26 mm' }],
    ['rivet', 'hole', 'metric', { number: '#30', unit: '', also: '3.26 mm · 0.1285 in' }],
    ['bolt', 'bolt', 'inch', { number: 'AN3-6', unit: '', also: '' }],
    ['countersink-or-dimple', 'method', 'inch', { number: 'dimple', unit: '', also: '' }],
  ] as const)('of %s %s, %s first', (slug, name, first, expected) => {
    expect(bigNumber(named(slug, name), first)).toEqual(expected)
  })

  it('of a drill never stands without its decimal, in any table', () => {
    for (const { slug } of SHOP_TABLES) for (const result of resultsOf(slug)) {
      for (const first of ['inch', 'metric'] as const) {
        const { number, also } = bigNumber(result, first)
        if (/^(?:#\d|[A-Z](?:,|$))/.test(number)) expect(also, `${slug} ${result.name}`).toMatch(/\d\.\d{4} in/)
      }
    }
  })
})

describe('Source and basis', () => {
  const source = { title: 'AC 43.13-1B', section: 'para 4-57', year: '1998' }

  it('name edition and place, and the year where there is one', () => {
    expect(sourceWords(source)).toBe('AC 43.13-1B, para 4-57 (1998)')
    expect(sourceWords({ ...source, year: 'n.d.' })).toBe('AC 43.13-1B, para 4-57')
  })

  it('are loud where a number was not looked up', () => {
    expect(basisWords({ basis: 'memory', source })).toEqual({ text: 'from memory, not checked against the standard', source: 'AC 43.13-1B, para 4-57 (1998)', isLoud: true })
    expect(basisWords({ basis: 'common-practice', source: null })).toEqual({ text: 'common practice, no source', source: '', isLoud: true })
    expect(basisWords({ basis: 'maker', source })).toMatchObject({ text: 'the kit maker’s own limit', isLoud: true })
    expect(basisWords({ basis: 'seen', source }).isLoud).toBe(false)
    expect(basisWords({ basis: 'arithmetic', source: null }).text).toBe('arithmetic on what was entered')
  })

  it('take the standing notes out of what is said aside, but report the one under a hole', () => {
    expect(noteWords('from memory, not checked against the standard; only where the plans show one; measure the part in hand; measure the groove of the grommet in hand first'))
      .toEqual({ text: 'measure the groove of the grommet in hand first', isHole: true })
    expect(noteWords(undefined)).toEqual({ text: '', isHole: false })
  })
})

describe('Rows', () => {
  it('put one value from several sources together and leave values that differ apart', () => {
    const holes = groupReadings(resultsOf('rivet', { diameter: '1/8' }).filter(({ name }) => name === 'hole'))
    expect(holes.map((group) => group.length)).toEqual([3])
    expect(groupReadings(resultsOf('tube').filter(({ name }) => name === 'torque')).length).toBe(2)
  })

  it('say a value in the other system only where it differs', () => {
    expect(valueWords(named('grommet', 'hole'), 'metric')).toEqual({ text: '15.88 mm', also: '5/8 in' })
    expect(valueWords(named('grommet', 'part'), 'inch')).toEqual({ text: 'AN931-6-10', also: '' })
  })
})

it('Help of a field gives hint, limits and the other units', () => {
  expect(inputHelp({ kind: 'length', unit: 'in', min: 0.05, max: 6, hint: 'the diameter the sheet sits in' })).toBe('the diameter the sheet sits in; 0.05 to 6 in, or mm')
  expect(inputHelp({ kind: 'choice', unit: '' })).toBe('')
})
