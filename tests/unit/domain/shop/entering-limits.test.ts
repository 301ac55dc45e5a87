// What a steward may enter as the kit maker's limit: exact in inch and metric, each mistake in words, and a second look at what is less safe.
import { describe, expect, it } from 'vitest'
import { lessSafe } from '@/lib/domain/shop/less-safe'
import { limitSense } from '@/lib/domain/shop/limit-sense'
import { limitTables, readLimit, unitsFor, type LimitText } from '@/lib/domain/shop/read-limit'
import { shopTable, SHOP_TABLES } from '@/lib/domain/shop/shop-tables'

type Typed = Partial<Omit<LimitText, 'value'>> & { value?: Partial<LimitText['value']> }
const read = ({ value, ...rest }: Typed) => readLimit({ table: 'rivet', result: 'edge-centre', inputs: {}, unit: '', ...rest, value: { number: '', min: '', max: '', words: '', ...value } })
const given = (typed: Typed) => {
  const entered = read(typed)
  if (!entered.ok) throw new Error(entered.errors.map(({ path, message }) => `${path}: ${message}`).join('; '))
  return entered.given
}
const wrong = (typed: Typed) => {
  const entered = read(typed)
  return entered.ok ? [] : entered.errors.map(({ path }) => path)
}
const warned = (typed: Typed) => {
  const entered = given(typed)
  const table = shopTable(entered.table)
  if (!table) throw new Error('no such table')
  return lessSafe(table, entered)
}

describe('A limit', () => {
  it('given in millimetres is the same length in inches, and reads as the tables read', () => {
    expect(given({ value: { min: '6.35' }, unit: 'mm' })).toMatchObject({ value: { min: 0.25 }, unit: 'in', display: { inch: 'at least 1/4 in', metric: 'at least 6.35 mm' } })
  })

  it('given in newton metres is kept in inch-pounds: 1 in-lb is 0.1129848290276167 N·m (NIST SP 811, App. B.8)', () => {
    const torque = given({ table: 'torque', result: 'torque', value: { min: '2.5', max: '3' }, unit: 'N·m' })
    expect(torque).toMatchObject({ unit: 'lbf-in', display: { inch: '22.1 to 26.6 in-lb', metric: '2.50 to 3.00 N·m' } })
    expect(torque.value.min).toBeCloseTo(2.5 / 0.1129848290276167, 10)
    expect(given({ table: 'torque', result: 'torque', value: { number: '2' }, unit: 'ft-lb' }).value).toEqual({ number: 24 })
  })

  it('that is one number of a least result is its least, and of a most result its most', () => {
    expect(given({ value: { number: '5/16' } }).value).toEqual({ min: 0.3125 })
    expect(given({ table: 'torque', result: 'heat', value: { number: '120' }, unit: '°C' })).toMatchObject({ value: { max: 248 }, display: { inch: 'at most 248 °F', metric: 'at most 120 °C' } })
    expect(given({ result: 'hole', value: { number: '0.1285' } }).value).toEqual({ number: 0.1285 })
  })

  it('may be in words, and keeps the choice it names by its value', () => {
    expect(given({ result: 'alloy', inputs: { diameter: '0.125', head: '' }, value: { words: 'only 2117' } })).toMatchObject({ inputs: { diameter: '1/8' }, value: { label: 'only 2117' }, unit: '' })
  })

  it('names the field of each mistake', () => {
    expect(wrong({ table: 'nothing' })).toEqual(['table'])
    expect(wrong({ table: 'units', result: 'in' })).toEqual(['table'])
    expect(wrong({ result: 'nothing' })).toEqual(['result'])
    expect(wrong({})).toEqual(['value.number'])
    expect(wrong({ value: { number: '1', words: 'one' } })).toEqual(['value.number'])
    expect(wrong({ value: { min: '3', max: '2' } })).toEqual(['value.max'])
    expect(wrong({ inputs: { diameter: '17', colour: 'red' }, value: { min: 'zero', max: '-1' }, unit: 'kg' })).toEqual(['inputs.colour', 'inputs.diameter', 'unit', 'value.min', 'value.max'])
    for (const number of ['0', '-2', '1/0', '1e3', '9999999999', 'NaN']) expect(wrong({ value: { number } }), number).toEqual(['value.number'])
  })

  it('can be given for every result of every table, in each of its units', () => {
    for (const table of limitTables(SHOP_TABLES)) for (const { name } of table.results) for (const unit of unitsFor(table, name)) {
      const { display } = given({ table: table.slug, result: name, value: { min: '2', max: '3' }, unit })
      expect(`${display.inch} | ${display.metric}`, `${table.slug} ${name}`).toMatch(/\d.*\|.*\d/)
    }
  })
})

describe('A limit less safe than the handbook’s', () => {
  it('is looked at for the thickest sheet too, when it names none', () => {
    const table = shopTable('bend')
    if (!table) throw new Error('no bend table')
    expect(lessSafe(table, { result: 'radius-least', inputs: { alloy: '2024-T3' }, value: { number: 0.125 }, unit: 'in', display: { inch: '1/8 in', metric: '3.18 mm' } })).toContain('allows less than the handbook’s')
  })

  it('is told before it is kept: 7/32 of a 1/8 rivet is under 2 D (TM 10-5410-229-13&P, para 5-6)', () => {
    expect(warned({ inputs: { diameter: '1/8' }, value: { min: '7/32' } })).toBe('At least 7/32 in allows less than the handbook’s 1/4 in (2 D), for rivet diameter 1/8 in (US Army TM 10-5410-229-13&P, para 5-6(3)(b)). Is the page right?')
  })

  it('is found in the one case among all that it holds for: 2 D is too little for flush heads', () => {
    expect(warned({ value: { min: '2' }, unit: 'D' })).toContain('Flush AN426')
    expect(warned({ inputs: { head: 'universal' }, value: { min: '2' }, unit: 'D' })).toBeNull()
    expect(warned({ value: { min: '2.5' }, unit: 'D' })).toBeNull()
  })

  it('may be too much as well as too little: AN3 takes 20 to 25 in-lb with a tension nut (AC 43.13-1B, Table 7-1)', () => {
    const torque = { table: 'torque', result: 'torque', inputs: { thread: 'AN3', nut: 'tension' } }
    expect(warned({ ...torque, value: { min: '28', max: '32' } })).toContain('allows more than the handbook’s 20 to 25 in-lb')
    expect(warned({ ...torque, value: { min: '15', max: '20' } })).toContain('allows less')
    expect(warned({ ...torque, value: { min: '20' } }), 'no upper end').toContain('allows more')
    expect(warned({ ...torque, value: { min: '22', max: '24' } })).toBeNull()
  })

  it('is not looked for in words, nor where nothing is a limit', () => {
    expect(warned({ value: { words: 'as page 12 shows' } })).toBeNull()
    expect(warned({ result: 'length', value: { number: '0.01' } })).toBeNull()
  })

  it('is known for results that are there', () => {
    for (const table of SHOP_TABLES) for (const { name } of table.results) if (/least|most/.test(name) && name !== 'least-primary') expect(limitSense(table.slug, name), `${table.slug} ${name}`).not.toBeNull()
  })
})
