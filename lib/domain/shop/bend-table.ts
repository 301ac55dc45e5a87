// The bend table: setback, allowance, flat length of a leg or a channel, least radius. The arithmetic is bend-rules.ts.
import data from '@/content/shop/bends.json'
import { BEND_ALLOYS, bendAllowances, circleAllowance, developedLength, kFactor, radiusRows, setback } from './bend-rules'
import { ARITHMETIC, cite } from './citation'
import type { InputReader } from './shop-input'
import { amount, lengthRange, noValue, result, thickness as inches } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'

export const bendTable = defineTable({
  slug: 'bend',
  title: 'Bend allowance',
  inputs: [
    { name: 'radius', label: 'Inside radius', unit: 'in', kind: 'length', min: 0, max: 4, default: '1/8' },
    { name: 'thickness', label: 'Thickness', unit: 'in', kind: 'length', min: 0.01, max: 0.5, default: '0.040' },
    { name: 'angle', label: 'Bent through', unit: 'deg', kind: 'number', min: 1, max: 170, default: '90', hint: 'from flat; 135 makes a closed corner of 45' },
    { name: 'alloy', label: 'Alloy and temper', unit: '', kind: 'choice', default: '2024-T3', options: BEND_ALLOYS.map((alloy) => ({ value: alloy, label: alloy, ...(alloy.endsWith('-O') ? { aliases: [alloy.replace('-O', '-0')] } : {}) })) },
    { name: 'legA', label: 'First leg, to the outside corner', unit: 'in', kind: 'length', min: 0.01, max: 200, default: '1' },
    { name: 'legB', label: 'Second leg, or the web between', unit: 'in', kind: 'length', min: 0.01, max: 200, default: '1' },
    { name: 'legC', label: 'Third leg of a channel', unit: 'in', kind: 'length', min: 0.01, max: 200, default: null },
  ],
  results: [
    { name: 'setback', label: 'Setback', unit: 'in' }, { name: 'k', label: 'K', unit: '' }, { name: 'allowance', label: 'Bend allowance', unit: 'in' }, { name: 'flat', label: 'Flat', unit: 'in' },
    { name: 'flat-length', label: 'Flat length', unit: 'in' }, { name: 'radius-least', label: 'Radius, least', unit: 'in' }, { name: 'radius-times', label: 'Radius in thicknesses', unit: 't' },
  ],
  cautions: ['structure', 'sharp-edges', 'pinch'],
  check(given) {
    const back = setback(given.number('radius'), given.number('thickness'), given.number('angle'))
    return (['legA', 'legB', 'legC'] as const).flatMap((name) => {
      const leg = given.optionalNumber(name)
      const bends = name === 'legB' && given.optionalNumber('legC') !== undefined ? 2 : 1
      return leg !== undefined && leg < back * bends - 1e-9 ? [{ path: name, message: `This leg is shorter than the setback: at least ${(back * bends).toFixed(3)} in with this radius and angle.` }] : []
    })
  },
  work: (given) => [...bend(given), ...leastRadius(given)],
})

function bend(given: InputReader): ShopResult[] {
  const [radius, thickness, angle] = [given.number('radius'), given.number('thickness'), given.number('angle')]
  const back = setback(radius, thickness, angle)
  const legs = [given.number('legA'), given.number('legB'), given.optionalNumber('legC')].filter((leg) => leg !== undefined)
  const bends = legs.length - 1
  const flats = legs.map((leg, index) => leg - back * (index > 0 && index < bends ? 2 : 1))
  const named = [...bendAllowances(radius, thickness, angle), { cite: data.circle.cite, allowance: circleAllowance(radius, thickness, angle), how: `2 pi (R + T/2) × ${angle}/360` }]
  return [
    result('setback', inches(back), cite(data.setback.cite, 'worked'), { how: 'K (R + T)' }),
    result('k', amount(kFactor(angle), ''), cite(data.k.cite, 'worked'), { how: 'tangent of half the angle' }),
    ...named.map((entry) => result('allowance', inches(entry.allowance), cite(entry.cite, 'worked'), { how: entry.how })),
    ...flats.map((flat, index) => result('flat', inches(flat), ARITHMETIC, { how: `leg ${'ABC'[index] ?? ''} less setback` })),
    ...named.map((entry) => result('flat-length', inches(developedLength(flats, entry.allowance, bends)), cite(entry.cite, 'worked'), { how: `flats + ${bends} × ${entry.allowance.toFixed(3)}`, note: 'bend a strip of the same sheet first and measure it' })),
  ]
}

function leastRadius(given: InputReader): ShopResult[] {
  const [alloy, thickness, radius] = [given.word('alloy'), given.number('thickness'), given.number('radius')]
  const rows = radiusRows(alloy, thickness)
  const source = cite(data.radii.cite)
  if (rows.length === 0) return [result('radius-least', noValue('in'), source, { note: 'the table goes from 0.016 to 0.258 in sheet: no value for this one' })]
  const angle = given.number('angle') === 90 ? undefined : 'the table is for 90-degree bends'
  return rows.flatMap((row, index) => {
    const aside = rows.length === 1 ? undefined : `the table has no row for ${thickness.toFixed(3)}: this is its row for ${row.thickness.toFixed(3)}${index === 1 ? ', the safer of the two' : ''}`
    const yours = radius < row.minTimes * thickness - 1e-9 ? 'your radius is tighter than this row allows' : undefined
    const note = [aside, angle, yours].filter(Boolean).join('; ')
    const times = `${row.minTimes} to ${row.maxTimes} t`
    return [
      result('radius-least', lengthRange(row.minTimes * thickness, row.maxTimes * thickness), cite(data.radii.cite, 'worked'), { how: times, note, against: yours }),
      result('radius-times', { value: { min: row.minTimes, max: row.maxTimes }, unit: 't', display: { inch: times, metric: times } }, source, { how: `${alloy}, ${row.thickness.toFixed(3)}`, note: aside }),
    ]
  })
}
