// The grommet table: the hole in the sheet from the bore, the designation or the measured groove, and what cuts it.
import data from '@/content/shop/grommets.json'
import { ARITHMETIC, cite, COMMON_PRACTICE, HOLE_NOTE, type Citation } from './citation'
import { drillsOf, nextDrill } from './drill-series'
import { drillNames, drillResult } from './drill-table'
import { fractionOfInch, inchesOf } from './exact-fraction'
import { decodeGrommet, grommetFor, grommetsOfBore, grommetsOfHole, stepDrill, type Grommet } from './grommet-rules'
import type { InputReader } from './shop-input'
import { drillSize, length, noValue, result, words } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'

const MEASURE = 'measure the groove of the grommet in hand first'
const none = 'the list gives no grommet of this size: measure the groove of the one in hand'

export const grommetTable = defineTable({
  slug: 'grommet',
  title: 'Grommet holes',
  inputs: [
    { name: 'bore', label: 'Bore, the side of the wire', unit: 'in', kind: 'length', min: 0.05, max: 4, default: '3/8' },
    { name: 'groove', label: 'Groove, measured across', unit: 'in', kind: 'length', min: 0.05, max: 6, default: null, hint: 'the diameter the sheet sits in' },
    { name: 'through', label: 'What goes through: outside diameter', unit: 'in', kind: 'length', min: 0.02, max: 4, default: null, hint: 'tube, conduit or bundle' },
    { name: 'hole', label: 'Hole already there', unit: 'in', kind: 'drill', min: 0.05, max: 6, default: null },
    { name: 'part', label: 'Part number', unit: '', kind: 'part', default: null, hint: 'such as AN931-6-10' },
  ],
  results: [
    { name: 'hole', label: 'Hole in the sheet', unit: 'in' }, { name: 'part', label: 'Grommet', unit: '' }, { name: 'bore', label: 'Bore', unit: 'in' },
    { name: 'hole-groove', label: 'Hole for the measured groove', unit: 'in' }, { name: 'through-grommet', label: 'Grommet for what goes through', unit: '' },
    { name: 'through-hole', label: 'Hole for that grommet', unit: 'in' }, { name: 'through-clear', label: 'Hole that leaves 3/8 in all round', unit: 'in' },
    { name: 'for-hole', label: 'Grommet for the hole', unit: '' }, { name: 'drill', label: 'Drill', unit: 'in' }, { name: 'drill-below', label: 'Drill, next below', unit: 'in' },
    { name: 'drill-above', label: 'Drill, next above', unit: 'in' }, { name: 'step-drill', label: 'Step drill', unit: 'in' }, { name: 'clearance', label: 'Without a grommet: clearance at least', unit: 'in' }, { name: 'wet', label: 'Where fluids reach', unit: '' },
  ],
  cautions: ['structure', 'eyes', 'sharp-edges'],
  check(given) {
    const part = given.optionalWord('part')
    if (part !== undefined && !decodeGrommet(part)) return [{ path: 'part', message: 'Part number: write a grommet as AN931-A-B, such as AN931-6-10, B larger than A.' }]
    return []
  },
  work(given) {
    const main = chosenGrommets(given)
    const groove = given.optionalNumber('groove')
    const cut = groove ?? main[0]?.hole
    return [
      ...(groove === undefined ? [] : [result('hole-groove', length(groove), COMMON_PRACTICE, { note: HOLE_NOTE, how: 'the sheet sits in the groove' })]),
      ...main.flatMap(grommetResults),
      ...(main.length === 0 ? [result('hole', noValue('in'), cite(data.rule.cite), { note: none })] : []),
      ...through(given), ...forHole(given), ...(cut === undefined ? [] : cutters(cut)),
      result('clearance', length(inchesOf(data.clearance.inches)), cite(data.clearance.cite), { note: 'where clamps cannot hold it, a grommet is needed' }),
      result('wet', words(data.wet.words), cite(data.wet.cite)),
    ]
  },
})

function chosenGrommets(given: InputReader): Grommet[] {
  const part = decodeGrommet(given.optionalWord('part') ?? '')
  return part ? [part] : grommetsOfBore(given.number('bore'))
}

function grommetResults(grommet: Grommet): ShopResult[] {
  const source = cite(grommet.cite)
  const sixteenths = Math.round(grommet.hole * 16)
  return [
    result('hole', length(grommet.hole), source, { note: `${HOLE_NOTE}; ${MEASURE}`, how: `${grommet.designation}: second dash ${sixteenths}, in sixteenths` }),
    result('part', words(grommet.also ? `${grommet.designation}, also ${grommet.also}` : grommet.designation), source),
    result('bore', length(grommet.bore), source, { how: `first dash ${Math.round(grommet.bore * 16)}, in sixteenths` }),
  ]
}

function through(given: InputReader): ShopResult[] {
  const outside = given.optionalNumber('through')
  if (outside === undefined) return []
  const grommet = grommetFor(outside)
  const clear = outside + 2 * inchesOf(data.clearance.inches)
  return [
    ...(grommet ? [result('through-grommet', words(grommet.designation), cite(grommet.cite)), result('through-hole', length(grommet.hole), cite(grommet.cite), { note: `${HOLE_NOTE}; ${MEASURE}` })]
      : [result('through-grommet', noValue(''), cite(data.rule.cite), { note: none })]),
    result('through-clear', length(clear), cite(data.clearance.cite, 'worked'), { how: 'outside diameter + 2 × 3/8', note: `${HOLE_NOTE}; a wire held in the middle of a hole this size needs no grommet` }),
  ]
}

function forHole(given: InputReader): ShopResult[] {
  const hole = given.optionalNumber('hole')
  if (hole === undefined) return []
  const found = grommetsOfHole(hole)
  const dash = Math.round(hole * 16)
  const rule = Math.abs(hole * 16 - dash) < 1e-6 ? `by the rule its second dash number would be -${dash}` : 'the rule counts whole sixteenths'
  return found.length > 0 ? found.map((grommet) => result('for-hole', words(grommet.designation), cite(grommet.cite), { how: `bore ${fractionOfInch(grommet.bore) ?? grommet.bore.toFixed(3)}`, note: MEASURE }))
    : [result('for-hole', noValue(''), cite(data.rule.cite), { note: `the list gives no grommet for this hole; ${rule}` })]
}

/** What cuts the hole: drills up to 1 in, step drills in sixteenths. */
function cutters(hole: number): ShopResult[] {
  const [exact] = drillsOf(hole)
  const { exact: step, under, over } = stepDrill(hole)
  const custom: Citation = COMMON_PRACTICE
  return [
    exact ? result('drill', drillSize(exact, drillNames(exact)), cite(exact.cite)) : result('drill', noValue('in'), ARITHMETIC, { note: 'no drill of this size up to 1 in' }),
    ...(hole <= 1 ? [drillResult('drill-below', nextDrill(hole, -1), 'none'), drillResult('drill-above', nextDrill(hole, 1), 'drills end at 1 in')] : []),
    step ? result('step-drill', length(inchesOf(step)), custom, { how: 'a step drill with sixteenth steps, to the last step' })
      : result('step-drill', noValue('in'), custom, { note: `no sixteenth step of this size${under && over ? `: ${under} is under, ${over} over` : ''}` }),
  ]
}
