// The wire table: size by current, length and drop, clearance to a hole edge, supports. The arithmetic is wire-rules.ts.
import data from '@/content/shop/wire.json'
import { defineTable } from './shop-table'
import { routing } from './wire-routing'
import { sizing } from './wire-sizing'
import { WIRES } from './wire-rules'

export const wireTable = defineTable({
  slug: 'wire',
  title: 'Wire',
  inputs: [
    { name: 'current', label: 'Current', unit: 'A', kind: 'number', min: 0.01, max: 400, default: '10' },
    { name: 'length', label: 'Run, with the ground wire', unit: 'ft', kind: 'number', min: 0.1, max: 1000, default: '10', hint: 'out and back where the ground is a wire' },
    { name: 'system', label: 'System', unit: 'V', kind: 'choice', default: '14', options: data.allowed.rows.map(({ volts }) => ({ value: String(volts), label: `${volts} V`, ...(volts === 14 ? { aliases: ['12'] } : volts === 28 ? { aliases: ['24'] } : {}) })) },
    { name: 'duty', label: 'Duty', unit: '', kind: 'choice', default: 'continuous', options: [{ value: 'continuous', label: 'continuous' }, { value: 'intermittent', label: 'intermittent' }] },
    { name: 'rating', label: 'Wire rated', unit: '°C', kind: 'choice', default: '150', options: ['105', '150', '200'].map((value) => ({ value, label: `${value} °C` })) },
    { name: 'drop', label: 'Drop you allow', unit: 'V', kind: 'number', min: 0.01, max: 50, default: null, hint: 'in place of the table’s' },
    { name: 'awg', label: 'Wire in hand', unit: '', kind: 'choice', default: null, options: WIRES.map(({ awg }) => ({ value: awg, label: `AWG ${awg}` })) },
    { name: 'temperature', label: 'Conductor temperature', unit: '°C', kind: 'number', min: 20, max: 250, default: null },
    { name: 'clearance', label: 'Clearance to the hole edge', unit: 'in', kind: 'length', min: 0.001, max: 12, default: null },
    { name: 'bundle', label: 'Bundle diameter', unit: 'in', kind: 'length', min: 0.02, max: 4, default: null },
    { name: 'spacing', label: 'Supports apart', unit: 'in', kind: 'length', min: 0.5, max: 120, default: null },
  ],
  results: [
    { name: 'size', label: 'Wire', unit: 'AWG' }, { name: 'size-current', label: 'Wire for the current', unit: 'AWG' }, { name: 'size-drop', label: 'Wire for the drop', unit: 'AWG' }, { name: 'allowed', label: 'Drop allowed', unit: 'V' },
    { name: 'drop', label: 'Drop with that wire', unit: 'V' }, { name: 'longest', label: 'Longest run of that wire', unit: 'ft' }, { name: 'longest-warm', label: 'Longest run, warm', unit: 'ft' },
    { name: 'hand-drop', label: 'Drop with the wire in hand', unit: 'V' }, { name: 'hand-longest', label: 'Longest run of the wire in hand', unit: 'ft' }, { name: 'hand-current', label: 'Wire in hand carries', unit: 'A' },
    { name: 'resistance', label: 'Resistance', unit: 'ohm/1000 ft' }, { name: 'area', label: 'Conductor', unit: 'circ mil' }, { name: 'strands', label: 'Strands nicked, broken', unit: 'strands' },
    { name: 'clearance', label: 'Clearance to a hole edge', unit: 'in' }, { name: 'support', label: 'Supports, at most apart', unit: 'in' }, { name: 'slack', label: 'Sag between supports, at most', unit: 'in' },
    { name: 'reterminations', label: 'Slack at the ends for', unit: 'reterminations' }, { name: 'fluid', label: 'From fuel and oxygen lines', unit: 'in' }, { name: 'fluid-reduced', label: 'The same where impracticable', unit: 'in' },
    { name: 'ties', label: 'Ties where supports are over', unit: 'in' }, { name: 'lacing', label: 'Single-cord lacing up to', unit: 'in' }, { name: 'conduit', label: 'Conduit, inside at least', unit: 'in' },
    { name: 'bend-radius', label: 'Bend radius, least', unit: 'in' }, { name: 'bend-terminal', label: 'The same at a terminal strip', unit: 'in' },
  ],
  cautions: ['electrical', 'fire', 'fuel'],
  work: (given) => [...sizing(given), ...routing(given)],
})
