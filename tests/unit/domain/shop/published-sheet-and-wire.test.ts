// Bends, wire, grommets and units against their published values. Each test names its source.
import { expect } from 'vitest'
import { developedLength } from '@/lib/domain/shop/bend-rules'
import { findWire, longestRun, voltageDrop, warmRun } from '@/lib/domain/shop/wire-rules'
import bending from './published/bending.json'
import electrical from './published/electrical.json'
import units from './published/units.json'
import wiring from './published/wire-and-grommets.json'
import { ask, named, one, reproduces } from './published-rows'

const bend = (raw: Record<string, string | number>) => ask('bend', { legA: 50, legB: 100, ...raw })

reproduces('bending', bending, [
  [/^bendrad-/, ({ inputs }, expected, near) => {
    const times = named(bend({ alloy: String(inputs.alloy), thickness: Number(inputs.thickness_in), angle: Number(inputs.bend_deg) }), 'radius-times')
    expect(times).toHaveLength(1)
    near(times[0]?.value.min, expected.min_x_t)
    near(times[0]?.value.max, expected.max_x_t)
  }],
  [/^setback-formula$/, () => expect(one(bend({ radius: 0.2, thickness: 0.05, angle: 60 }), 'setback').value.number).toBeCloseTo(Math.tan(Math.PI / 6) * 0.25, 12)],
  [/^kfactor-/, ({ inputs, expected }, _, near) => near(one(bend({ angle: Number(inputs.bend_deg) }), 'k').value.number, expected)],
  [/^(setback-ex-closed|uchannel-setback)$/, ({ inputs, expected }, _, near) => near(one(bend({ radius: Number(inputs.R), thickness: Number(inputs.T), angle: Number(inputs.bend_deg) }), 'setback').value.number, expected)],
  [/^uchannel-ba$/, ({ inputs, expected }, _, near) => {
    for (const allowance of named(bend({ radius: Number(inputs.R), thickness: Number(inputs.T), angle: Number(inputs.bend_deg) }), 'allowance').slice(0, 2)) near(allowance.value.number, expected)
  }],
  [/^uchannel-total$/, ({ inputs, expected }, _, near) => {
    const flats = named(ask('bend', { radius: 0.16, thickness: 0.04, legA: 1, legB: 2, legC: 1 }), 'flat').map(({ value }) => Number(value.number?.toFixed(9)))
    expect(flats).toEqual(inputs.flats)
    near(developedLength(flats, Number(inputs.bend_allowance), Number(inputs.bends)), expected)
  }],
  [/^ba-formula-navy$/, () => expect(one(bend({ radius: 0.3, thickness: 0.05, angle: 40 }), 'allowance', 'NAVEDTRA').value.number).toBeCloseTo((0.0173 * 0.3 + 0.0078 * 0.05) * 40, 12)],
  [/^ba-formula-faa$/, () => expect(one(bend({ radius: 0.3, thickness: 0.05, angle: 40 }), 'allowance', 'AC 65-15A').value.number).toBeCloseTo((0.01743 * 0.3 + 0.0078 * 0.05) * 40, 12)],
  [/^ba-ex\d/, ({ inputs }, expected, near) => {
    const results = bend({ radius: Number(inputs.R), thickness: Number(inputs.T), angle: Number(inputs.bend_deg) })
    near(one(results, 'allowance', 'NAVEDTRA').value.number, expected.navy)
    near(one(results, 'allowance', 'AC 65-15A').value.number, expected.faa)
  }],
])

const wire = (raw: Record<string, string | number> = {}) => ask('wire', raw)
const grommet = (raw: Record<string, string | number> = {}) => ask('grommet', raw)

reproduces('wire and grommets', wiring, [
  [/^wire-support-spacing$/, ({ expected }, _, near) => near(one(wire(), 'support').value.number, expected)],
  [/^wire-grommet-clearance$/, ({ expected }, _, near) => {
    near(one(wire(), 'clearance').value.number, expected)
    near(one(grommet(), 'clearance').value.number, expected)
    expect(one(wire({ clearance: 0.37 }), 'clearance').note).toContain('a grommet is needed')
  }],
  [/^wire-slack-deflection$/, ({ expected }, _, near) => near(one(wire(), 'slack').value.number, expected)],
  [/^wire-reterminations$/, ({ expected }, _, near) => near(one(wire(), 'reterminations').value.number, expected)],
  [/^wire-fluid-line-separation$/, ({ expected }, _, near) => near(one(wire(), 'fluid').value.number, expected)],
  [/^wire-fluid-line-separation-reduced$/, ({ expected }, _, near) => near(one(wire(), 'fluid-reduced').value.number, expected)],
  [/^wire-bundle-ties$/, ({ expected }, _, near) => near(one(wire(), 'ties').value.number, expected)],
  [/^wire-lacing-single-cord$/, ({ expected }, _, near) => near(one(wire(), 'lacing').value.number, expected)],
  [/^wire-conduit-size$/, ({ expected }, _, near) => near(((one(wire({ bundle: 1 }), 'conduit').value.number ?? 0) - 1) * 100, expected)],
  [/^wire-grommet-material-wet$/, ({ expected }) => expect(one(grommet(), 'wet').value.label).toBe(expected)],
  [/^wire-nicked-/, ({ inputs }, expected) => {
    for (const awg of String(inputs.wire_size).split('-')) expect(one(wire({ awg }), 'strands').value.label).toBe(`${String(expected.nicked)} nicked, ${String(expected.broken)} broken of ${String(inputs.strands)}`)
  }],
  [/^wire-hose-support$/, ({ expected }, _, near) => near(one(ask('tube', { joint: 'hose' }), 'hose-support').value.number, expected)],
  [/^wire-hose-length-change$/, (_, expected) => expect(one(ask('tube', { joint: 'hose' }), 'hose-length').value).toEqual({ min: -Number(expected.minus), max: expected.plus })],
  [/^wire-bend-radius$/, ({ expected }, _, near) => {
    const radius = one(wire({ bundle: 1 }), 'bend-radius')
    near(radius.value.number, expected)
    expect(radius.note).toContain('the recalled texts differ')
  }],
  [/^wire-bend-radius-terminal$/, ({ expected }, _, near) => near(one(wire({ bundle: 1 }), 'bend-terminal').value.number, expected)],
  [/^grommet-naming$/, () => {
    const results = grommet({ part: 'AN931-7-11' })
    expect([one(results, 'bore').value.number, one(results, 'hole').value.number]).toEqual([7 / 16, 11 / 16])
    expect(one(results, 'hole').note).toContain('from memory, not checked against the standard')
  }],
  [/^grommet-AN931-/, ({ inputs }, expected, near) => {
    const byPart = grommet({ part: String(inputs.designation) })
    const byBore = grommet({ bore: Number(expected.inside_diameter) })
    for (const results of [byPart, byBore]) {
      near(one(results, 'hole').value.number, expected.panel_hole)
      near(one(results, 'bore').value.number, expected.inside_diameter)
      expect(one(results, 'hole').note).toContain('only where the plans show one; measure the part in hand')
    }
  }],
], { 'wire-oring-storage': 'how warm O-rings may be stored is no shop table' })

reproduces('electrical', electrical, [
  [/^wire-\d+$/, ({ inputs }, expected) => {
    const awg = String(inputs.awg)
    for (const rating of ['105', '150', '200']) expect(one(wire({ awg, rating }), 'hand-current').value.number).toBe(expected[`amps_${rating}C`])
    expect(one(wire({ awg }), 'resistance').value.number).toBe(expected.ohms_per_1000ft)
    expect(one(wire({ awg }), 'area').value.number).toBe(expected.circ_mils)
  }],
  [/^vdrop-size-/, ({ inputs }, expected, near) => {
    const results = wire({ current: Number(inputs.current_A), length: Number(inputs.run_ft), drop: Number(inputs.allowed_drop_V), awg: String(expected.wire) })
    expect(one(results, 'size-drop').value.label).toBe(`AWG ${String(expected.wire)}`)
    near(one(results, 'hand-drop').value.number, expected.check_V)
  }],
  [/^vdrop-length-/, ({ inputs }, expected, near) => {
    const chosen = findWire(String(inputs.wire))!
    near(voltageDrop(chosen, Number(expected.max_run_ft), Number(inputs.current_A)), expected.check_V)
    // The AC reads its run off a chart: not over the exact one, and within a foot of it.
    const exact = longestRun(chosen, Number(inputs.allowed_drop_V), Number(inputs.current_A))
    expect(exact - Number(expected.max_run_ft)).toBeGreaterThanOrEqual(0)
    expect(exact - Number(expected.max_run_ft)).toBeLessThan(1)
  }],
  [/^vdrop-allow-/, ({ inputs }, expected, near) => {
    for (const duty of ['continuous', 'intermittent']) near(one(wire({ system: String(inputs.system_V), duty }), 'allowed').value.number, expected[duty])
  }],
  [/^length-temp-copper$/, ({ inputs, expected }, _, near) => near(warmRun(Number(inputs.L1_ft), Number(inputs.T2_C)), expected)],
])

const names: Record<string, string> = { 'N.m': 'N·m', mm2: 'mm²', degC: '°C', 'lbf-in': 'lbf-in', 'lbf-ft': 'lbf-ft', inHg_conventional: 'inHg', nautical_mile: 'nmi', US_gal: 'US gal', sq_in: 'sq in', degF: '°F' }

reproduces('units', units, [
  [/^unit-/, ({ inputs, unit, expected }, _, near) => {
    const [[from, value] = ['', 0]] = Object.entries(inputs)
    const to = names[unit] ?? unit
    near(one(ask('units', { value: String(value), from: names[from] ?? from, to }), to).value.number, expected)
  }],
])
