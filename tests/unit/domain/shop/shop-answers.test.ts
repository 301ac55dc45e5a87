// What a builder is told: differing sources side by side, no value where there is none, the maker's limit first, units there and back.
import Fraction from 'fraction.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { withMakerLimits, type MakerLimit } from '@/lib/domain/shop/maker-limits'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { findDrill } from '@/lib/domain/shop/drill-series'
import { decodeGrommet } from '@/lib/domain/shop/grommet-rules'
import { decodeRivet, rivetDesignation } from '@/lib/domain/shop/rivet-designation'
import { TORQUE_THREADS } from '@/lib/domain/shop/torque-rules'
import { machineScrewDiameter, passesScrew, smallestDrillFor } from '@/lib/domain/shop/screw-clearance'
import { findWire, voltageDrop } from '@/lib/domain/shop/wire-rules'
import { convertExact, UNIT_KINDS } from '@/lib/domain/shop/unit-conversion'
import { ask, named, one } from './published-rows'

describe('Torque', () => {
  it('is never given for a thread that Table 7-1 does not list', () => {
    for (const thread of ['1-12', '1-8', '1-1/8-8', '1-1/4-8']) {
      const results = ask('torque', { thread, lever: 10 })
      expect(one(results, 'torque').value).toEqual({})
      expect(one(results, 'torque').note).toContain(`no torque for ${thread}`)
      expect(one(results, 'wrench').value).toEqual({})
      expect(named(results, 'most')).toEqual([])
    }
    expect(TORQUE_THREADS).toContain('1-12')
  })

  it('on a tube of a size between those listed has no value at all', () => {
    expect(one(ask('tube', { size: '-2', joint: 'steel' }), 'torque').value).toEqual({})
    expect(one(ask('tube', { size: '-24', joint: 'aluminium' }), 'torque').value).toEqual({})
  })

  it('on aluminium tube stands as two ranges from two sources, not as a blend', () => {
    const ranges = named(ask('tube', { size: '-4' }), 'torque')
    expect(ranges.map(({ value, basis }) => [value.min, value.max, basis])).toEqual([[50, 65, 'seen'], [40, 65, 'memory']])
    for (const { note } of ranges) expect(note).toContain('never mix them')
  })

  it('of a reused locking nut stands once for each source that lists it', () => {
    expect(named(ask('torque', { thread: '7/16-20' }), 'prevailing').map(({ value }) => value.number)).toEqual([8, 14])
    expect(one(ask('torque', { thread: '8-36' }), 'prevailing').value).toEqual({})
  })

  it('refuses an extension without a lever, and one that would turn the wrench round', async () => {
    const { torqueTable } = await import('@/lib/domain/shop/torque-table')
    for (const [raw, path] of [[{ extension: 3 }, 'lever'], [{ reading: 50 }, 'lever'], [{ lever: 4, extension: 3, direction: 'shorter' }, 'extension']] as const) {
      const outcome = torqueTable.compute(raw)
      expect(outcome.ok ? '' : outcome.errors[0]?.path).toBe(path)
    }
  })

  it('names the AC misprint-free values where a reprint differs (10-24 shear 21, 3/8-16 tension 160-185)', () => {
    expect(one(ask('torque', { thread: '10-24', nut: 'shear' }), 'most').value.number).toBe(21)
    expect(one(ask('torque', { thread: '3/8-16' }), 'torque').value).toEqual({ min: 160, max: 185 })
  })

  it('answers to the bolt as well as to its thread', () => {
    expect(one(ask('torque', { thread: 'AN3' }), 'torque').value).toEqual({ min: 20, max: 25 })
  })
})

describe('Sources that differ', () => {
  it('list three holes for a 3/32 rivet', () => {
    expect(named(ask('rivet', { diameter: '3/32' }), 'hole').map(({ value, basis }) => `${value.label} ${basis}`)).toEqual(['#40 memory', '#41 memory', '#41 seen'])
  })

  it('say dimple, countersink or nothing for a sheet between their limits', () => {
    expect(named(ask('countersink-or-dimple', { sheet: 0.045, diameter: '1/8' }), 'method').map(({ value }) => value.label)).toEqual([undefined, 'dimple', 'countersink'])
  })

  it('give the rows on both sides for a sheet the bend table does not list', () => {
    const rows = named(ask('bend', { thickness: 0.04 }), 'radius-times')
    expect(rows.map(({ value }) => [value.min, value.max])).toEqual([[2, 4], [3, 5]])
    for (const { note } of rows) expect(note).toContain('no row for 0.040')
    expect(one(ask('bend', { thickness: 0.3, legA: 2, legB: 2 }), 'radius-least').value).toEqual({})
  })
})

describe('Grommets', () => {
  it('answer 5/8 for a 3/8 bore, from memory, and say to measure', () => {
    const results = ask('grommet', { bore: '3/8' })
    expect(one(results, 'hole').display).toEqual({ inch: '5/8 in', metric: '15.88 mm' })
    expect(one(results, 'part').value.label).toBe('AN931-6-10')
    for (const phrase of ['from memory, not checked against the standard', 'only where the plans show one; measure the part in hand']) expect(one(results, 'hole').note).toContain(phrase)
    expect(one(results, 'drill').value.label).toBe('5/8')
    expect(one(results, 'step-drill').value.label).toBe('5/8')
  })

  it('put the measured groove before the list', () => {
    const results = ask('grommet', { bore: '3/8', groove: '0.61' })
    expect(results[0]).toMatchObject({ name: 'hole-groove', value: { number: 0.61 }, basis: 'common-practice', source: null })
    expect(one(results, 'step-drill').note).toContain('9/16 is under, 5/8 over')
  })

  it('have no hole for a bore that is not listed, and refuse a groove smaller than its bore', () => {
    expect(one(ask('grommet', { bore: '7/16' }), 'hole').value).toEqual({})
    expect([decodeGrommet('AN931-6-6'), decodeGrommet('AN931-0-4'), decodeGrommet('MS35489-6')]).toEqual([null, null, null])
  })

  it('find the grommet a tube goes through, and the hole that needs none', () => {
    const results = ask('grommet', { through: '0.3' })
    expect(one(results, 'through-grommet').value.label).toBe('AN931-5-9')
    expect(one(results, 'through-clear').value.number).toBeCloseTo(1.05, 9)
  })
})

describe('Designations', () => {
  it('of rivets come back from what they decode to', () => {
    fc.assert(fc.property(fc.constantFrom('universal' as const, 'flush' as const), fc.integer({ min: 2, max: 12 }), fc.integer({ min: 2, max: 64 }), (head, size, halfSteps) => {
      const part = rivetDesignation(head, 'AD', size / 32, halfSteps / 32)
      const decoded = decodeRivet(part)
      expect([decoded?.part, decoded?.diameter, decoded?.length]).toEqual([part, size / 32, halfSteps / 32])
    }))
  })

  it('are refused with an example when they are none', async () => {
    const { rivetTable } = await import('@/lib/domain/shop/rivet-table')
    const { boltTable } = await import('@/lib/domain/shop/bolt-table')
    for (const outcome of [rivetTable.compute({ part: 'AN470AD4' }), boltTable.compute({ part: 'AN3-8A' }), boltTable.compute({ part: 'AN3-3A' }), boltTable.compute({ part: 'AN4-5A' })]) {
      expect(outcome.ok ? '' : outcome.errors[0]?.path).toBe('part')
    }
  })

  it('of drills are found as people write them', () => {
    expect(['#30', 'No. 30', 'number 30', '# 30', 'f', '3/16', '6/32', 'letter F'].map((text) => findDrill(text)?.name)).toEqual(['#30', '#30', '#30', '#30', 'F', '3/16', '3/16', 'F'])
    expect(['30', '#81', '#0', '1/0', 'AA', ''].map((text) => findDrill(text))).toEqual([null, null, null, null, null, null])
  })
})

describe('A wrong bolt', () => {
  it('shows too much shank, too few threads, or threads in the hole', () => {
    const hand = (part: string, raw = {}) => one(ask('bolt', { part, thickness: '1/2', washers: 0, ...raw }), 'in-hand').value.label
    expect(hand('AN3-7A')).toBe('the grip is the thickness')
    expect(hand('AN3-6A')).toContain('too short: about 4.0 threads')
    expect(hand('AN3-12A')).toContain('too much shank')
    expect(one(ask('bolt', { thickness: '1/2', washers: 0, nut: 0.4 }), 'threads-showing').note).toContain('under one thread')
  })
})

describe("The maker's own limits", () => {
  const withLimits = (slug: string, raw: Record<string, string>, limits: readonly MakerLimit[]) => {
    const table = shopTable(slug)
    const outcome = table?.compute(raw)
    if (!table || !outcome?.ok) throw new Error(`no answer of ${slug}`)
    return withMakerLimits(table, outcome.inputs, outcome.results, limits)
  }
  const edges = (raw: Record<string, string>, limits: readonly MakerLimit[]) => named(withLimits('rivet', raw, limits), 'edge-centre').filter(({ basis }) => basis === 'maker')

  const limit = { table: 'rivet', inputs: {}, result: 'edge-centre', value: { number: 0.2188 }, unit: 'in', display: { inch: '7/32 in', metric: '5.56 mm' }, reference: { title: 'Bulletin 7', section: 'page 2', year: '2024' } }

  it('stand first and are named; the handbook stays listed', () => {
    const results = withLimits('rivet', {}, [limit])
    const edges = named(results, 'edge-centre')
    expect(edges.map(({ basis, source }) => [basis, source?.title.slice(0, 10)])).toEqual([['maker', 'Bulletin 7'], ['arithmetic', 'US Army TM']])
    expect(edges[1]?.note).toContain('the kit maker’s own limit wins')
  })

  it('stand alone where the handbook has no such result, and not in other tables', () => {
    expect(withLimits('rivet', {}, [{ ...limit, result: 'dent' }])[0]?.name).toBe('dent')
    expect(withLimits('bolt', {}, [limit])).toEqual(ask('bolt', {}))
  })

  it('hold only where the inputs they name have that value, however it is spelled', () => {
    for (const diameter of ['1/8', '0.125', '0.125 in', '-4']) {
      expect(edges({ diameter: '1/8' }, [{ ...limit, inputs: { diameter } }]), diameter).toHaveLength(1)
      expect(edges({ diameter: '5/32' }, [{ ...limit, inputs: { diameter } }]), diameter).toEqual([])
    }
    expect(edges({ stack: '1.6256 mm' }, [{ ...limit, inputs: { stack: '0.064' } }])).toHaveLength(1)
    expect(edges({}, [{ ...limit, inputs: { edge: '1/4' } }]), 'an input that was not given').toEqual([])
    expect(edges({ head: 'universal' }, [{ ...limit, inputs: { diameter: '1/8', head: 'flush' } }]), 'one of two').toEqual([])
  })

  it('leave what the table works out from the handbook, and say so', () => {
    const torque = { ...limit, table: 'torque', result: 'torque', value: { min: 26, max: 31 }, unit: 'lbf-in' }
    // AN3 at 20 to 25 in-lb (AC 43.13-1B, Table 7-1) and 6 in-lb of drag.
    expect(named(withLimits('torque', { thread: 'AN3', drag: '6' }, [torque]), 'with-drag')[0]).toMatchObject({ value: { min: 26, max: 31 }, note: expect.stringContaining('not from the kit maker’s limit') })
    expect(named(withLimits('torque', { thread: 'AN4', drag: '6' }, [{ ...torque, inputs: { thread: 'AN3' } }]), 'with-drag')[0]?.note ?? '').not.toContain('kit maker')
  })

  it('are held against what was measured, also where the handbook is met', () => {
    const three = { ...limit, value: { min: 3 }, unit: 'D', display: { inch: 'at least 3 D', metric: 'at least 3 D' } }
    // 3 × 1/8 less 5/16 is 1/16; the handbook's 2 D is met.
    expect(edges({ edge: '5/16' }, [three])[0]).toMatchObject({ against: 'short by 1/16 in of the kit maker’s least' })
    expect(edges({ edge: '3/8' }, [three])[0]?.against).toBeUndefined()
    const support = { ...limit, table: 'wire', result: 'support', value: { max: 12 } }
    expect(named(withLimits('wire', { spacing: '18' }, [support]), 'support')[0]).toMatchObject({ basis: 'maker', against: 'over the kit maker’s most by 6 in' })
  })

  it('in diameters are worked out for the rivet asked for: 2 D of 5/32 is 5/16', () => {
    const twice = { ...limit, value: { min: 2 }, unit: 'D', display: { inch: 'at least 2 D', metric: 'at least 2 D' } }
    expect(edges({ diameter: '5/32' }, [twice])).toMatchObject([{ value: { min: 0.3125 }, unit: 'in', display: { inch: 'at least 5/16 in', metric: 'at least 7.94 mm' }, how: 'at least 2 D' }])
  })
})

describe('Units', () => {
  it('come back exactly from every unit of their kind', () => {
    const kinds = UNIT_KINDS.flatMap(({ units }) => units.flatMap((from) => units.map((to) => [from, to] as const)))
    fc.assert(fc.property(fc.constantFrom(...kinds), fc.integer({ min: -99999, max: 99999 }), fc.integer({ min: 1, max: 640 }), ([from, to], numerator, denominator) => {
      const value = new Fraction(numerator, denominator)
      const there = convertExact(value, from, to)
      expect(there && convertExact(there, to, from)?.equals(value)).toBe(true)
    }))
  })

  it('agree with the fixed points of their definitions', () => {
    const exact = (value: string, from: string, to: string) => convertExact(new Fraction(value), from, to)?.toFraction()
    // NIST SP 811, App. B: all exact by definition.
    expect([exact('1', 'in', 'mm'), exact('212', '°F', '°C'), exact('-40', '°C', '°F'), exact('0', '°C', 'K'), exact('1', 'lbf-ft', 'lbf-in'), exact('1', 'kt', 'km/h'), exact('1', 'US gal', 'US qt')])
      .toEqual(['127/5', '100', '-40', '5463/20', '12', '463/250', '4'])
    expect(convertExact(new Fraction(1), 'in', 'kg')).toBeNull()
  })
})

describe('Further printed values', () => {
  it('give the smaller wires of AC 43.13-1B Table 11-9 (p. 11-23, 2001)', () => {
    for (const [awg, amps105, amps150, amps200, ohms, mils] of [['24', 2.5, 4, 5, 28.4, 475], ['18', 6, 9, 12, 6.23, 1900], ['14', 10, 14, 18, 3.06, 3831], ['12', 13, 19, 25, 2.02, 5874]] as const) {
      expect(findWire(awg)).toEqual({ awg, amps: { 105: amps105, 150: amps150, 200: amps200 }, ohmsPer1000ft: ohms, circularMils: mils })
    }
  })

  it('agree with the checks of AC 43.13-1B Table 11-8 (p. 11-22, 2001), rows 3 and 4', () => {
    // Printed 3.93 and 6.88 to two places.
    expect([voltageDrop(findWire('10')!, 156, 20), voltageDrop(findWire('10')!, 273, 20)].map((volts) => volts.toFixed(2))).toEqual(['3.93', '6.88'])
  })

  it('give the rest of AC 43.13-1B Table 7-2 (p. 7-12, 1998)', () => {
    for (const [thread, least] of [['7/8-14', 40], ['1-1/8-12', 73], ['7/16-14', 8], ['7/8-9', 40]] as const) expect(one(ask('torque', { thread }), 'prevailing', 'AC 43.13').value.number).toBe(least)
  })

  it('give the open-angle setback of AC 43.13-1B para 4-56b(2): K 0.41421, 0.130 in', () => {
    const results = ask('bend', { radius: 0.25, thickness: 0.064, angle: 45 })
    expect(one(results, 'k').value.number).toBeCloseTo(0.41421, 5)
    expect(one(results, 'setback').value.number).toBeCloseTo(0.13, 3)
  })

  it('give the formed heads of the P-40 repair manual, para 14, for 5/32 and 3/16', () => {
    for (const [diameter, high, wide] of [['5/32', 0.078, 0.234], ['3/16', 0.093, 0.281]] as const) {
      const results = ask('rivet', { diameter })
      // The manual cuts 0.0938 to .093: a thousandth.
      expect(Math.abs((one(results, 'head-height').value.number ?? 0) - high)).toBeLessThanOrEqual(0.001)
      expect(Math.abs((one(results, 'head-width').value.number ?? 0) - wide)).toBeLessThanOrEqual(0.001)
      expect(one(results, 'head-width').basis).toBe('seen')
    }
  })
})

describe('Numbered screws', () => {
  it('are no numbered drills: a #8 screw needs more than #30, and #19 passes it', () => {
    expect(machineScrewDiameter(8)).toBe(0.164)
    expect([findDrill('#30')!, findDrill('#19')!].map(({ inches }) => passesScrew(inches, 8))).toEqual([false, true])
    expect(smallestDrillFor(8)?.name).toBe('#19')
    // #4 0.112, #6 0.138, #10 0.190: Machinery's Handbook, American standard machine screws, basic major diameters.
    expect([4, 6, 10].map(machineScrewDiameter)).toEqual([0.112, 0.138, 0.19])
    expect(one(ask('drills', { screw: '8' }), 'screw-drill')).toMatchObject({ value: { number: 0.166, label: '#19' }, basis: 'memory' })
    expect(named(ask('drills', {}), 'screw-drill')).toEqual([])
    expect([machineScrewDiameter(13), machineScrewDiameter(-1), machineScrewDiameter(1.5)]).toEqual([null, null, null])
  })
})
