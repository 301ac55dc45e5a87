// What holds for every input of every shop table: no crash, errors that name the field, sources beside numbers, and the order of things.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import sources from '@/content/shop/sources.json'
import { boltLengths, BOLTS_WITH_LENGTHS } from '@/lib/domain/shop/bolt-designation'
import { chooseBolt } from '@/lib/domain/shop/bolt-choice'
import { bendAllowances, setback } from '@/lib/domain/shop/bend-rules'
import { DRILLS, nearestDrill, nextDrill } from '@/lib/domain/shop/drill-series'
import { fractionOfInch, parseExact } from '@/lib/domain/shop/exact-fraction'
import { RIVET_DIAMETERS, nearestStockLength, nextStockLength, rivetLength, shopHead } from '@/lib/domain/shop/rivet-rules'
import { inchesOf } from '@/lib/domain/shop/exact-fraction'
import { readInputs, type ShopInput } from '@/lib/domain/shop/shop-input'
import { BASES } from '@/lib/domain/shop/shop-table'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import { torqueAtNut, wrenchReading } from '@/lib/domain/shop/torque-rules'
import { WIRES, wireForCurrent, wireForDrop } from '@/lib/domain/shop/wire-rules'
import { ask, one } from './published-rows'

const likely = fc.oneof(fc.string({ maxLength: 80 }), fc.constantFrom('', '0', '-1', '1e9', '1/0', '3/8', '#30', 'AN3-5A', '5 kg', '½', '999999999999', '0.1 in', '2.8 N·m', '__proto__'), fc.double(), fc.integer())
const anyValue = (input: ShopInput) => fc.oneof({ weight: 1, arbitrary: likely }, { weight: 4, arbitrary: validValue(input) })

function validValue(input: ShopInput): fc.Arbitrary<string | number | undefined> {
  const given: fc.Arbitrary<string | number | undefined> = input.kind === 'choice' ? fc.constantFrom(...(input.options ?? []).map(({ value }) => value))
    : input.kind === 'part' ? fc.constantFrom('AN3-5A', 'AN470AD4-7', 'AN931-6-10', 'nonsense')
      : fc.double({ min: input.min ?? 0, max: input.max ?? 1000, noNaN: true })
  return fc.oneof({ weight: 3, arbitrary: given }, { weight: 1, arbitrary: fc.constant(undefined) })
}

describe.each(SHOP_TABLES.map((table) => [table.slug, table] as const))('The %s table', (slug, table) => {
  const raws = fc.record(Object.fromEntries(table.inputs.map((input) => [input.name, anyValue(input)])), { requiredKeys: [] })

  it('answers or names the field, whatever it is sent', () => {
    fc.assert(fc.property(raws, (raw) => {
      const outcome = table.compute(raw)
      if (outcome.ok) return
      expect(outcome.errors.length).toBeGreaterThan(0)
      for (const { path, message } of outcome.errors) {
        expect(table.inputs.map(({ name }) => name)).toContain(path)
        expect(message.endsWith('.')).toBe(true)
      }
    }), { numRuns: 400 })
  })

  it('gives each result a declared name, finite numbers, a basis, and a source or the word that there is none', () => {
    fc.assert(fc.property(raws, (raw) => {
      const outcome = table.compute(raw)
      if (!outcome.ok) return
      for (const item of outcome.results) {
        expect(table.results.map(({ name }) => name)).toContain(item.name)
        expect(BASES).toContain(item.basis)
        for (const number of [item.value.number, item.value.min, item.value.max]) expect(number === undefined || Number.isFinite(number)).toBe(true)
        if (Object.keys(item.value).length === 0) expect(item.note, `${slug} ${item.name}`).toBeTruthy()
        if (item.basis === 'memory') expect(item.note).toContain('from memory, not checked against the standard')
        if (item.basis === 'common-practice') expect(item.source).toBeNull()
        if (item.basis === 'seen') expect(item.source?.title).toBeTruthy()
        expect(item.display.inch && item.display.metric).toBeTruthy()
      }
    }), { numRuns: 300 })
  })

  it('computes from its own defaults', () => {
    expect(table.compute({}).ok).toBe(true)
    expect(shopTable(slug)).toBe(table)
  })

  it('says what is allowed when a number is missing, negative, absurd or of the wrong unit', () => {
    for (const input of table.inputs.filter(({ kind }) => kind !== 'part')) {
      for (const bad of [input.kind === 'choice' ? '-99' : '-3', '1e12', '5 kg', 'abc', '1/0', ...(input.default === null ? [] : [''])]) {
        const outcome = table.compute({ [input.name]: bad })
        expect(outcome.ok, `${input.name} = ${bad}`).toBe(false)
        if (!outcome.ok) expect(outcome.errors.some(({ path, message }) => path === input.name && message.includes(input.label)), input.name).toBe(true)
      }
    }
  })

  it('refuses a field it does not know and lists the ones it has', () => {
    const outcome = table.compute({ wing: '1' })
    expect(outcome.ok ? [] : outcome.errors.map(({ path }) => path)).toEqual(['wing'])
  })
})

describe('Sources', () => {
  it('carry title, section, year and a known basis', () => {
    for (const [key, source] of Object.entries(sources)) {
      expect(source.title && source.section && source.year, key).toBeTruthy()
      expect(BASES, key).toContain(source.basis)
    }
  })
})

describe('Order', () => {
  const grips = fc.double({ min: 0.01, max: 3, noNaN: true })
  const pairs = fc.tuple(grips, grips).map(([a, b]) => [Math.min(a, b), Math.max(a, b)] as const)

  it('never gives a shorter rivet to a thicker grip', () => {
    fc.assert(fc.property(pairs, fc.constantFrom(...RIVET_DIAMETERS), ([thin, thick], size) => {
      const diameter = inchesOf(size)
      expect(rivetLength(thick, diameter)).toBeGreaterThanOrEqual(rivetLength(thin, diameter))
      expect(nearestStockLength(rivetLength(thick, diameter))).toBeGreaterThanOrEqual(nearestStockLength(rivetLength(thin, diameter)))
      expect(nextStockLength(rivetLength(thin, diameter))).toBeGreaterThanOrEqual(rivetLength(thin, diameter) - 1e-9)
    }))
  })

  it('lets head, edge and pitch grow with the rivet, and asks more of a flush one', () => {
    const sizes = RIVET_DIAMETERS.map((diameter) => ask('rivet', { diameter }))
    for (const name of ['head-width', 'head-height-least', 'edge-centre', 'edge-rim', 'pitch-least', 'row-least']) {
      const values = sizes.map((results) => one(results, name).value.number ?? NaN)
      expect(values, name).toEqual([...values].sort((a, b) => a - b))
    }
    for (const diameter of RIVET_DIAMETERS) expect(one(ask('rivet', { diameter, head: 'flush' }), 'edge-centre').value.number).toBeGreaterThan(one(ask('rivet', { diameter }), 'edge-centre').value.number ?? NaN)
    expect(shopHead(0.125, '7050').leastWidth).toBeGreaterThan(shopHead(0.125, 'AD').leastWidth)
  })

  it('runs drills from small to large by number, letter and fraction, and finds neighbours on both sides', () => {
    const numbers = DRILLS.filter(({ series }) => series === 'number').map(({ name }) => Number(name.slice(1)))
    expect(numbers).toEqual(Array.from({ length: 80 }, (_, index) => 80 - index))
    expect(DRILLS.filter(({ series }) => series === 'letter').map(({ name }) => name).join('')).toBe('ABCDEFGHIJKLMNOPQRSTUVWXYZ')
    fc.assert(fc.property(fc.double({ min: 0.0135, max: 1, noNaN: true }), (inches) => {
      const [below, above, nearest] = [nextDrill(inches, -1), nextDrill(inches, 1), nearestDrill(inches)]
      if (below) expect(below.inches).toBeLessThan(inches)
      if (above) expect(above.inches).toBeGreaterThan(inches)
      for (const other of [below, above]) if (other && nearest) expect(Math.abs(nearest.inches - inches)).toBeLessThanOrEqual(Math.abs(other.inches - inches) + 1e-9)
    }))
  })

  it('never gives a shorter bolt to a thicker stack, and covers the stack', () => {
    fc.assert(fc.property(pairs, fc.constantFrom(...BOLTS_WITH_LENGTHS), ([thin, thick], bolt) => {
      const [small, large] = [chooseBolt(bolt, thin).choice, chooseBolt(bolt, thick).choice]
      if (small && large) expect(large.length).toBeGreaterThanOrEqual(small.length)
      if (small) expect(small.grip).toBeGreaterThan(thin - 0.01)
    }))
    for (const bolt of BOLTS_WITH_LENGTHS) {
      const steps = boltLengths(bolt).map(({ length }) => length)
      for (const [index, length] of steps.entries()) if (index > 0) expect(length - (steps[index - 1] ?? NaN)).toBeCloseTo(0.125, 12)
    }
  })

  it('bends more metal with a larger radius, thickness or angle', () => {
    fc.assert(fc.property(fc.double({ min: 0.01, max: 1, noNaN: true }), fc.double({ min: 0.01, max: 0.2, noNaN: true }), fc.double({ min: 1, max: 160, noNaN: true }), (radius, thickness, angle) => {
      expect(setback(radius * 1.1, thickness, angle)).toBeGreaterThan(setback(radius, thickness, angle))
      expect(setback(radius, thickness, angle + 1)).toBeGreaterThan(setback(radius, thickness, angle))
      for (const [index, { allowance }] of bendAllowances(radius, thickness, angle).entries()) expect(bendAllowances(radius, thickness * 1.1, angle)[index]?.allowance).toBeGreaterThan(allowance)
    }))
  })

  it('turns a wrench reading back into the torque at the nut', () => {
    fc.assert(fc.property(fc.double({ min: 1, max: 5000, noNaN: true }), fc.double({ min: 4, max: 40, noNaN: true }), fc.double({ min: 0.1, max: 2, noNaN: true }), fc.constantFrom('longer' as const, 'shorter' as const, 'square' as const), (torque, lever, extension, direction) => {
      const reading = wrenchReading(torque, lever, extension, direction)
      expect(torqueAtNut(reading, lever, extension, direction)).toBeCloseTo(torque, 6)
      if (direction === 'longer') expect(reading).toBeLessThan(torque)
      if (direction === 'shorter') expect(reading).toBeGreaterThan(torque)
    }))
  })

  it('gives thicker wire more current, less resistance and more metal', () => {
    for (const [index, wire] of WIRES.entries()) {
      const thinner = WIRES[index - 1]
      if (!thinner) continue
      for (const rating of ['105', '150', '200'] as const) expect(wire.amps[rating]).toBeGreaterThan(thinner.amps[rating])
      expect(wire.ohmsPer1000ft).toBeLessThan(thinner.ohmsPer1000ft)
      expect(wire.circularMils).toBeGreaterThan(thinner.circularMils)
    }
    expect([wireForCurrent(1000, '105'), wireForDrop(0.01, 1000, 300)]).toEqual([null, null])
  })
})

describe('Fractions', () => {
  it('come back from their own text exactly', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 6400 }), (parts) => {
      expect(parseExact(fractionOfInch(parts / 64) ?? '')?.valueOf()).toBe(parts / 64)
    }))
  })

  it('are read in each way a shop writes them, and nothing else is', () => {
    expect(['3/16', '1 1/4', '1-1/4', '½', '1½', '.375', '12.', '-2'].map((text) => parseExact(text)?.valueOf())).toEqual([0.1875, 1.25, 1.25, 0.5, 1.5, 0.375, 12, -2])
    expect(['', 'x', '1/0', '1//2', '1/2/3', '--1', '1e5', 'NaN', '1 2 3/4', '3/'].map((text) => parseExact(text))).toEqual(Array.from({ length: 10 }, () => null))
  })

  it('keep their limits in metric too', () => {
    const input: ShopInput = { name: 'bore', label: 'Bore', unit: 'in', kind: 'length', min: 0.5, max: 1, default: null }
    expect(readInputs([input], { bore: '12.7 mm' })).toEqual({ ok: true, inputs: { bore: 0.5 } })
    expect(readInputs([input], { bore: '25.5 mm' }).ok).toBe(false)
    expect(readInputs([input], {})).toEqual({ ok: true, inputs: {} })
  })
})
