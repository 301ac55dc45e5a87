// The tube table: torque of flared tube nuts, bend radius of tube and hose. The two torque tables differ on aluminium and are never blended.
import data from '@/content/shop/tubes.json'
import { cite } from './citation'
import { fractionOfInch, inchesOf } from './exact-fraction'
import type { InputReader } from './shop-input'
import { amount, amountRange, length, noValue, result, thickness, torque, words } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'

export const TUBE_SIZES = [2, 3, 4, 5, 6, 8, 10, 12, 16, 20, 24] as const
export type TubeJoint = 'aluminium' | 'steel' | 'hose'

/** Nut torque in inch-pounds, one for each source that lists size and joint. */
export function tubeNutTorque(size: number, joint: TubeJoint): { cite: string; min: number; max: number }[] {
  return data.nuts.flatMap(({ cite: key, rows }) => rows.filter((row) => row.size === size && row.joint === joint).map(({ min, max }) => ({ cite: key, min, max })))
}

/** Least bend radius of a tube to its centre line, inches; null where the table gives none. */
export function tubeBendRadius(size: number, joint: 'aluminium' | 'steel'): number | null {
  return data.bends.rows.find((row) => row.size === size)?.[joint] ?? null
}

export const tubeDiameter = (size: number): number => size / data.code.sixteenths

export const tubeTable = defineTable({
  slug: 'tube',
  title: 'Tube and hose',
  inputs: [
    { name: 'size', label: 'Size', unit: '', kind: 'choice', default: '-6', options: TUBE_SIZES.map((size) => ({ value: `-${size}`, label: `-${size}, ${fractionOfInch(tubeDiameter(size)) ?? ''} in`, aliases: [String(size), fractionOfInch(tubeDiameter(size)) ?? ''] })) },
    { name: 'joint', label: 'Nut on', unit: '', kind: 'choice', default: 'aluminium', options: [{ value: 'aluminium', label: 'aluminium tube', aliases: ['aluminum', 'al'] }, { value: 'steel', label: 'steel tube' }, { value: 'hose', label: 'hose fitting' }] },
    { name: 'wall', label: 'Wall of the tube', unit: 'in', kind: 'length', min: 0.01, max: 0.25, default: null },
  ],
  results: [
    { name: 'torque', label: 'Flared nut torque', unit: 'lbf-in' }, { name: 'outside', label: 'Outside diameter', unit: 'in' }, { name: 'inside', label: 'Inside diameter', unit: 'in' },
    { name: 'bend-radius', label: 'Bend radius, least', unit: 'in' }, { name: 'flattened', label: 'Across a flattened bend, at least', unit: 'in' }, { name: 'hand-bend', label: 'Bend without a bender', unit: '' },
    { name: 'flare-angle', label: 'Flare', unit: 'deg' }, { name: 'hose-bend-radius', label: 'Hose bend radius, least', unit: 'in' }, { name: 'hose-pressure', label: 'Hose pressure', unit: 'psi' },
    { name: 'hose-support', label: 'Hose supports, at most apart', unit: 'in' }, { name: 'hose-length', label: 'Hose changes length by', unit: 'percent' },
  ],
  cautions: ['fuel', 'brakes', 'powerplant'],
  check(given) {
    const [wall, outside] = [given.optionalNumber('wall'), tubeDiameter(-Number(given.word('size')))]
    return wall !== undefined && wall * 2 >= outside ? [{ path: 'wall', message: `Wall of the tube: less than half the outside diameter, ${(outside / 2).toFixed(4)} in here.` }] : []
  },
  work(given) {
    const size = -Number(given.word('size'))
    const joint = given.word('joint')
    return [...nut(size, joint === 'steel' || joint === 'hose' ? joint : 'aluminium'), ...tube(size, given), ...(joint === 'hose' ? hose(size) : [])]
  },
})

function nut(size: number, joint: TubeJoint): ShopResult[] {
  const found = tubeNutTorque(size, joint)
  if (found.length === 0) return [result('torque', noValue('lbf-in'), cite('flare-army'), { note: `no table here lists a torque for -${size} on ${joint}: ask the kit maker` })]
  const differ = new Set(found.map(({ min, max }) => `${min}-${max}`)).size > 1 && 'the sources differ: never mix them, the plans decide'
  return found.map(({ cite: key, min, max }) => result('torque', torque(min, max), cite(key), { note: differ }))
}

function tube(size: number, given: InputReader): ShopResult[] {
  const [outside, wall, joint] = [tubeDiameter(size), given.optionalNumber('wall'), given.word('joint')]
  const code = cite(data.code.cite, 'worked')
  const radius = joint === 'hose' ? undefined : tubeBendRadius(size, joint === 'steel' ? 'steel' : 'aluminium')
  return [
    result('outside', length(outside), code, { how: `${size} sixteenths` }),
    ...(wall === undefined ? [] : [result('inside', thickness(outside - 2 * wall), code, { how: `${outside.toFixed(4)} - 2 × ${wall.toFixed(3)}` })]),
    ...(radius === undefined ? [] : [radius === null ? result('bend-radius', noValue('in'), cite(data.bends.cite), { note: `the table gives none for -${size} ${joint} tube` }) : result('bend-radius', length(radius), cite(data.bends.cite), { how: 'to the centre line' })]),
    ...(joint === 'hose' ? [] : [
      result('flattened', length(data.flattening.ofOutsideDiameter * outside), cite(data.flattening.cite, 'worked'), { how: '75 % of the outside diameter' }),
      result('hand-bend', words(outside < inchesOf(data.handBend.under) ? 'may be bent by hand' : 'use a bender: only under 1/4 in by hand'), cite(data.handBend.cite)),
    ]),
    result('flare-angle', amount(data.flareAngle.degrees, 'deg'), cite(data.flareAngle.cite), { note: 'a 45-degree car flare does not seal on it' }),
  ]
}

function hose(size: number): ShopResult[] {
  const row = data.hoses.rows.find((known) => known.size === size)
  const how = `${data.hoses.series}-${size}-L`
  return [
    ...(row ? [result('hose-bend-radius', thickness(row.bendRadius), cite(data.hoses.cite), { how }), result('hose-pressure', amount(row.psi, 'psi'), cite(data.hoses.cite), { how })]
      : [result('hose-bend-radius', noValue('in'), cite(data.hoses.cite), { note: `the table gives no -${size} hose` })]),
    result('hose-support', length(data.hoseSupport.inches), cite(data.hoseSupport.cite)),
    result('hose-length', amountRange(-data.hoseLength.minus, data.hoseLength.plus, 'percent'), cite(data.hoseLength.cite), { how: 'under pressure' }),
  ]
}
