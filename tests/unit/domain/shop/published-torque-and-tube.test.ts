// Nut and bolt torque, tube and hose against their published values. Torque has no tolerance: the number or nothing.
import { expect } from 'vitest'
import torques from './published/torque.json'
import tubing from './published/tubing.json'
import { ask, named, one, reproduces } from './published-rows'

reproduces('torque', torques, [
  [/^torque-(fine|coarse)-/, ({ inputs }, expected, near) => {
    const results = ask('torque', { thread: String(inputs.thread), nut: String(inputs.nut).split(' ')[0]! })
    const torque = one(results, 'torque')
    near(torque.value.min, expected.min)
    near(torque.value.max, expected.max)
    near(one(results, 'most').value.number, expected.max_allowable)
    expect(torque.source?.section).toContain('Table 7-1')
    expect(torque.note).toContain('oil-free cadmium-plated threads')
  }],
  [/^prevailing-ac-/, ({ inputs, expected }, _, near) => near(one(ask('torque', { thread: String(inputs.thread) }), 'prevailing', 'AC 43.13').value.number, expected)],
  [/^prevailing-army-/, ({ inputs, expected }, _, near) => near(one(ask('torque', { thread: String(inputs.thread) }), 'prevailing', 'US Army').value.number, expected)],
  [/^prevailing-rule-small$/, ({ expected }) => {
    const test = one(ask('torque', { thread: '3/8-24' }), 'finger-test')
    expect([test.value.label, test.basis]).toEqual([expected, 'memory'])
    expect(named(ask('torque', { thread: '7/16-20' }), 'finger-test')).toEqual([])
  }],
  [/^(selflock-temp-max|cadmium-temp-max|silver-plate-temp)$/, ({ inputs, expected }) => {
    const what = String(inputs.nut ?? inputs.finish)
    expect(named(ask('torque', {}), 'heat').find(({ how }) => how === what)?.value.number).toBe(expected)
  }],
  [/^drag-rule$/, () => expect(one(ask('torque', { thread: '1/4-28', drag: 15 }), 'with-drag').value).toEqual({ min: 65, max: 85 })],
  [/^castle-nut-rule$/, () => {
    const results = ask('torque', { thread: '1/4-28', drag: 15 })
    expect([one(results, 'castle-start').value.number, one(results, 'castle-limit').value.number]).toEqual([65, 85])
  }],
  [/^wrench-calibration$/, ({ expected }, _, near) => near(one(ask('torque', {}), 'calibration').value.number, expected)],
  [/^extension-formula$/, () => {
    const wrench = (direction: string) => one(ask('torque', { target: 120, lever: 12, extension: 3, direction }), 'wrench').value.number
    expect([wrench('longer'), wrench('shorter'), wrench('square')]).toEqual([120 * 12 / 15, 120 * 12 / 9, 120])
  }],
  [/^extension-(army|shortening)$/, ({ inputs, expected }, _, near) => {
    const adapter = Number(inputs.A)
    near(one(ask('torque', { target: Number(inputs.Ta), lever: Number(inputs.L), extension: Math.abs(adapter), direction: adapter < 0 ? 'shorter' : 'longer' }), 'wrench').value.number, expected)
  }],
  [/^extension-inverse$/, ({ inputs, expected }, _, near) => near(one(ask('torque', { reading: Number(inputs.Tw), lever: Number(inputs.L), extension: Number(inputs.A) }), 'at-nut').value.number, expected)],
])

const tube = (size: unknown, joint = 'aluminium', more: Record<string, number> = {}) => ask('tube', { size: String(size), joint, ...more })
const jointOf = (id: string): string => (id.endsWith('-al') ? 'aluminium' : id.endsWith('-steel') ? 'steel' : 'hose')

reproduces('tubing', tubing, [
  [/^hose-h8794-/, ({ inputs }, expected, near) => {
    const size = /-(\d+)-L/.exec(String(inputs.hose))?.[1]
    const results = tube(`-${size}`, 'hose')
    near(one(results, 'hose-bend-radius').value.number, expected.min_bend_radius_in)
    near(one(results, 'hose-pressure').value.number, expected.operating_psi)
  }],
  [/^flare-army-/, ({ id, inputs }, expected, near) => {
    const torque = one(tube(inputs.size, jointOf(id)), 'torque', 'US Army')
    near(torque.value.min, expected.min)
    near(torque.value.max, expected.max)
    expect(torque.source?.section).toContain('lubricated')
  }],
  [/^flare-faa-/, ({ id, inputs }, expected, near) => {
    const torque = one(tube(inputs.size, jointOf(id)), 'torque', 'FAA-H-8083-30')
    near(torque.value.min, expected.min)
    near(torque.value.max, expected.max)
    expect(torque.note).toContain('from memory, not checked against the standard')
  }],
  [/^tubebend-faa-/, ({ inputs }, expected, near) => {
    near(one(tube(inputs.size), 'bend-radius').value.number, expected.aluminium)
    const steel = one(tube(inputs.size, 'steel'), 'bend-radius')
    if (expected.steel === null) expect(steel.value).toEqual({})
    else near(steel.value.number, expected.steel)
  }],
  [/^tube-flattening$/, ({ expected }, _, near) => near((one(tube('-8'), 'flattened').value.number ?? 0) / 0.5, expected)],
  [/^tube-hand-bend-limit$/, ({ expected }) => {
    expect(expected).toBe(0.25)
    expect(one(tube('-3'), 'hand-bend').value.label).toBe('may be bent by hand')
    expect(one(tube('-4'), 'hand-bend').value.label).toContain('use a bender')
  }],
  [/^tube-dash-code$/, () => expect(one(tube('-10'), 'outside').value).toEqual({ number: 0.625, label: '5/8' })],
  [/^tube-id-example$/, ({ expected }, _, near) => near(one(tube('-10', 'aluminium', { wall: 0.065 }), 'inside').value.number, expected)],
  [/^flare-angle-an$/, ({ expected }, _, near) => near(one(tube('-6'), 'flare-angle').value.number, expected)],
])
