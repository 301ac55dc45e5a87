// Drills, rivet holes, rivet geometry and bolts against their published values. Each test names its source.
import { expect } from 'vitest'
import { decodeRivet } from '@/lib/domain/shop/rivet-designation'
import bolts from './published/bolts.json'
import drills from './published/drill-sizes.json'
import geometry from './published/rivet-geometry.json'
import holes from './published/rivet-holes.json'
import { ask, named, one, reproduces } from './published-rows'

const MEMORY = 'from memory, not checked against the standard'

reproduces('drill sizes', drills, [
  [/^drill-(no|letter|frac)-/, ({ inputs, expected }, _, near) => {
    const drill = one(ask('drills', { size: String(inputs.size) }), 'drill')
    near(drill.value.number, expected)
    expect(drill.value.label?.split(', ')).toContain(inputs.size)
    expect(drill.basis).toBe('seen')
  }],
])

const holeFrom = (source: string, diameter: unknown, stage = 'hole') => one(ask('rivet', { diameter: String(diameter) }), stage, source)

reproduces('rivet holes', holes, [
  [/^hole-final/, ({ inputs }, expected, near) => {
    const hole = holeFrom('FAA-H-8083-31', inputs.rivet_diameter_in)
    near(hole.value.number, expected.diameter)
    expect(hole.value.label?.split(', ')).toContain(expected.drill)
    expect([hole.basis, hole.note?.includes(MEMORY)]).toEqual(['memory', true])
  }],
  [/^hole-pilot/, ({ inputs }, expected, near) => {
    const pilot = holeFrom('FAA-H-8083-31', inputs.rivet_diameter_in, 'pilot')
    near(pilot.value.number, expected.diameter)
    expect(pilot.value.label?.split(', ')).toContain(expected.drill)
  }],
  [/^hole-mil5/, ({ inputs }, expected, near) => {
    const hole = holeFrom('MIL-HDBK-5', inputs.rivet_diameter_in)
    near(hole.value.number, expected.diameter)
    expect(hole.value.label?.split(', ')).toContain(expected.equal_to_drill)
    expect(hole.note).toContain(MEMORY)
  }],
  [/^hole-p40/, ({ inputs }, expected, near) => {
    const hole = holeFrom('P-40', inputs.rivet_diameter_in)
    near(hole.value.number, expected.diameter)
    expect([hole.value.label, hole.basis]).toEqual([expected.drill, 'seen'])
  }],
  [/^hole-blind/, ({ inputs }, expected, near) => {
    const hole = one(ask('rivet', { diameter: String(inputs.rivet_diameter_in), head: 'blind' }), 'hole')
    near(hole.value.min, expected.hole_min)
    near(hole.value.max, expected.hole_max)
    expect(hole.value.label).toBe(expected.drill)
  }],
])

const rivet = (raw: Record<string, string | number> = {}) => ask('rivet', raw)
const eighth = 0.125

reproduces('rivet geometry', geometry, [
  [/^rivet-length-rule$/, () => expect(one(rivet({ stack: '0.25', diameter: '1/4' }), 'length').value.number).toBe(0.25 + 1.5 * 0.25)],
  [/^rivet-length-ex/, ({ inputs }, expected, near) => {
    const needed = one(rivet({ stack: Number(inputs.grip_in), diameter: String(inputs.diameter_in) }), 'length', 'NAVEDTRA 14018').value.number
    near(needed, expected.length_exact_in)
    expect((needed ?? 0) * 16).toBeCloseTo(Number(expected.sixteenths_exact), 2)
  }],
  [/^rivet-length-long/, () => {
    const grips = [2, 2.5, 1, 0.9].map((stack) => (one(rivet({ stack, diameter: '5/16' }), 'length').value.number ?? 0) - stack - 1.5 * 0.3125)
    expect(grips.map((more) => Math.abs(Number(more.toFixed(6))))).toEqual([2 / 16, 2 / 16, 0, 0])
    expect(one(rivet({ stack: 2, diameter: '1/4' }), 'length').value.number).toBeCloseTo(2 + 0.375, 9)
  }],
  [/^shop-head-1-8$/, (_, expected, near) => {
    near(one(rivet(), 'head-width').value.number, expected.width)
    near(one(rivet(), 'head-height').value.number, expected.height)
    expect(one(rivet(), 'head-width').basis).toBe('seen')
  }],
  [/^shop-head-rule$/, () => {
    expect(one(rivet({ diameter: '1/4' }), 'head-width').value.number).toBe(1.5 * 0.25)
    expect(one(rivet({ diameter: '1/4' }), 'head-height').value.number).toBe(0.5 * 0.25)
  }],
  [/^shop-head-min-mil5$/, () => {
    expect(one(rivet(), 'head-width-least', 'MIL-HDBK-5H').value.number).toBe(1.3 * eighth)
    expect(one(rivet(), 'head-height-least', 'MIL-HDBK-5H').value.number).toBe(0.3 * eighth)
  }],
  [/^shop-head-min-mil5-7050$/, () => expect(one(rivet({ alloy: '7050' }), 'head-width-least').value.number).toBe(1.4 * eighth)],
  [/^edge-min-protruding$/, ({ expected }, _, near) => near((one(rivet(), 'edge-centre', 'TM 10-5410-229').value.number ?? 0) / eighth, expected)],
  [/^edge-min-countersunk$/, ({ expected }, _, near) => {
    const edge = one(rivet({ head: 'flush' }), 'edge-centre', 'FAA-H-8083-31')
    near((edge.value.number ?? 0) / eighth, expected)
    expect(edge.basis).toBe('memory')
  }],
  [/^pitch-min$/, ({ expected }, _, near) => near((one(rivet(), 'pitch-least').value.number ?? 0) / eighth, expected)],
  [/^pitch-usual-navy$/, (_, expected, near) => {
    const { value } = one(rivet(), 'pitch-usual', 'NAVEDTRA')
    near((value.min ?? 0) / eighth, expected.min)
    near((value.max ?? 0) / eighth, expected.max)
  }],
  [/^pitch-usual-faa$/, (_, expected, near) => {
    const usual = one(rivet(), 'pitch-usual', 'FAA-H-8083-31')
    near((usual.value.min ?? 0) / eighth, expected.usual_min)
    near((usual.value.max ?? 0) / eighth, expected.usual_max)
    expect(usual.note).toContain(`${String(expected.max_noted)} D`)
  }],
  [/^pitch-double-row-ac$/, ({ expected }, _, near) => near((one(rivet(), 'pitch-usual', '43.13').value.number ?? 0) / eighth, expected)],
  [/^row-spacing-min$/, ({ expected }, _, near) => near((one(rivet(), 'row-least').value.number ?? 0) / eighth, expected)],
  [/^row-spacing-usual$/, ({ expected }, _, near) => near(one(rivet({ pitch: 1 }), 'row-usual').value.number, expected)],
  [/^diameter-faa$/, () => {
    expect(one(rivet({ sheet: 0.032 }), 'sheet-diameter', '43.13').value.number).toBeCloseTo(0.096, 9)
    expect(one(rivet({ sheet: 0.032 }), 'sheet-diameter', 'FAA-H-8083-31').value.min).toBeCloseTo(0.096, 9)
    expect(one(rivet({ sheet: 0.032 }), 'sheet-stock').value.label).toBe('1/8')
  }],
  [/^diameter-navy$/, () => expect(one(rivet({ sheet: 0.05 }), 'sheet-diameter', 'NAVEDTRA').value).toEqual({ min: 0.05, max: 3 * 0.05 })],
  [/^tube-rivet-min-dia$/, ({ expected }, _, near) => near(one(rivet({ tube: 1 }), 'tube-diameter').value.number, expected)],
  [/^replace-2017/, () => {
    expect(one(rivet({ alloy: '2017', diameter: '3/16' }), 'replacement').value.number).toBe(0.1875 + 1 / 32)
    expect(one(rivet({ alloy: '2017', diameter: '1/4' }), 'replacement').value).toEqual({})
  }],
  [/^replace-2024/, () => {
    expect(one(rivet({ alloy: '2024', diameter: '5/32' }), 'replacement').value.number).toBe(0.1875)
    expect(one(rivet({ alloy: '2024', diameter: '3/16' }), 'replacement').value).toEqual({})
  }],
  [/^rivet-alloy-/, ({ inputs }, expected) => {
    const words = one(rivet({ alloy: String(inputs.code) }), 'alloy').value.label
    expect(words).toContain(expected.alloy)
    expect(words).toContain(expected.head_mark)
  }],
  [/^rivet-decode-/, ({ inputs }, expected) => {
    const part = String(inputs.part_number)
    const decoded = decodeRivet(part)
    expect([decoded?.head, decoded?.msNumber]).toEqual([expected.head, expected.ms_number])
    const words = one(rivet({ part }), 'part').value.label
    expect(words).toContain(`${String(expected.diameter_in)} in, ${String(expected.length_in)} in long`)
  }],
  [/^ms20426-head-/, ({ inputs }, expected, near) => {
    const results = ask('countersink-or-dimple', { diameter: String(inputs.diameter_in) })
    near(one(results, 'head-diameter').value.number, expected.head_diameter)
    near(one(results, 'head-height').value.number, expected.head_height)
    expect(one(results, 'angle').value.number).toBe(expected.angle_deg)
    expect(one(results, 'head-height').note).toContain(MEMORY)
  }],
  [/^dimple-max-thickness$/, ({ expected }) => {
    const method = (sheet: number) => one(ask('countersink-or-dimple', { sheet }), 'method', 'ch. 5, countersinking').value.label
    expect([method(Number(expected)), method(Number(expected) + 0.001)]).toEqual(['dimple', undefined])
  }],
  [/^drill-csk-min-sheet-p40$/, ({ inputs, expected }) => {
    const method = (sheet: number) => one(ask('countersink-or-dimple', { sheet, diameter: String(inputs.rivet_diameter_in) }), 'method', 'P-40').value.label
    expect([method(Number(expected) - 0.001), method(Number(expected))]).toEqual(['dimple', 'countersink'])
  }],
], { 'splice-example-rivet-count': 'how many rivets a splice needs is the design of a repair: the table checks a drawing that was given' })

const bolt = (raw: Record<string, string | number> = {}) => ask('bolt', raw)

reproduces('bolts', bolts, [
  [/^bolt-hole-/, ({ inputs }, expected, near) => {
    const hole = one(bolt({ bolt: String(inputs.bolt) }), 'hole')
    near(hole.value.min, expected.hole_min)
    near(hole.value.max, expected.hole_max)
  }],
  [/^bolt-light-drive-fit$/, ({ expected }, _, near) => near(one(bolt({ bolt: 'AN10' }), 'drive-fit').value.number, expected)],
  [/^bolt-clearance-rule$/, () => {
    const drill = (size: string) => one(bolt({ bolt: size }), 'clearance-hole').value.label
    expect([drill('AN4'), drill('AN5'), drill('AN6'), drill('AN3'), drill('AN7')]).toEqual(['F', 'O', 'V', undefined, undefined])
  }],
  [/^bolt-thread-/, ({ inputs }, expected) => {
    const thread = one(bolt({ bolt: String(inputs.bolt) }), 'thread')
    const nominal = { '9/8': '1-1/8', '5/4': '1-1/4' }[String(expected.nominal_in)] ?? expected.nominal_in
    expect(thread.value.label).toBe(`${String(nominal)} in, ${String(expected.thread)}`)
    expect(thread.note).toContain(inputs.bolt === 'AN16' ? '1-12' : MEMORY)
  }],
  [/^bolt-min-(steel|aluminium)-primary$/, ({ expected }) => expect(one(bolt(), 'least-primary').value.label).toContain(expected)],
  [/^bolt-mark-/, ({ inputs, expected }) => expect(named(bolt(), 'head-mark').some(({ value }) => value.label === `${String(inputs.material)}: ${String(expected)}`)).toBe(true)],
  [/^bolt-protrusion-ac$/, ({ expected }, _, near) => near(one(bolt(), 'threads-showing-least', 'AC 43.13').value.number, expected)],
  [/^bolt-protrusion-navy$/, ({ expected }, _, near) => near(one(bolt(), 'threads-showing-least', 'NAVEDTRA').value.number, expected)],
  [/^bolt-threads-in-hole-navy$/, ({ expected }, _, near) => {
    const most = one(bolt(), 'threads-in-hole-most')
    near(most.value.number, expected)
    expect(most.note).toContain('only in the thicker member')
  }],
  [/^bolt-grip-rule$/, () => {
    expect(one(bolt(), 'grip-rule').value.label).toContain('about equal to the thickness')
    expect(one(bolt({ thickness: '1/4', washers: 0 }), 'bolt').value.label).toBe('AN3-5')
    expect(one(bolt({ thickness: 0.3, washers: 0 }), 'bolt').value.label).toBe('AN3-6')
  }],
  [/^bolt-code$/, () => {
    const read = (part: string, size = 'AN3') => one(bolt({ part, bolt: size }), 'part').value.label
    expect(read('AN3-5A')).toBe('AN3, AN steel, head not drilled, shank not drilled')
    expect(read('AN3H-5')).toBe('AN3, AN steel, head drilled, shank drilled')
    expect(read('AN4C10A', 'AN4')).toContain('corrosion-resistant steel')
    expect(read('AN5DD7A', 'AN5')).toContain('aluminium alloy')
  }],
  [/^bolt-grip-AN\d-/, ({ inputs }, expected, near) => {
    const part = String(inputs.designation)
    const results = bolt({ part, bolt: part.slice(0, 3) })
    near(one(results, 'part-length').value.number, expected.length)
    near(one(results, 'part-grip').value.number, expected.grip)
  }],
])
