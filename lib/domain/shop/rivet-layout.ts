// Results of the rivet table about where rivets stand: edge distance, pitch, rows, diameter for a sheet or a tube.
import data from '@/content/shop/rivets.json'
import { cite } from './citation'
import { fractionOfInch, inchesOf } from './exact-fraction'
import { blindHole, diameterForSheet, finalHoles, leastEdge } from './rivet-rules'
import type { InputReader } from './shop-input'
import { atLeast, length, lengthRange, noValue, result, words } from './shop-result'
import type { ShopResult } from './shop-table'

/** Everything the table says about the place of rivets. */
export function edgeAndPitch(given: InputReader): ShopResult[] {
  const size = given.word('diameter')
  return [...edges(given, size), ...pitches(given, inchesOf(size)), ...forSheet(given), ...forTube(given)]
}

const inWords = (inches: number): string => fractionOfInch(inches) ?? inches.toFixed(3)

/** Whether what was measured falls short. Nothing measured doesn't. */
export const fallsShort = (have: number | undefined, least: number): boolean => have !== undefined && have - least < -1e-9

/** "short by 1/32 of 2 D", or undefined when nothing was measured. */
export function marginWords(have: number | undefined, least: number, rule: string): string | undefined {
  if (have === undefined) return undefined
  const off = have - least
  return fallsShort(have, least) ? `short by ${inWords(-off)} of ${rule}: stop, measure, ask the kit maker` : `yours is ${inWords(off)} over ${rule}`
}

function edges(given: InputReader, size: string): ShopResult[] {
  const diameter = inchesOf(size)
  const head = given.word('head') === 'flush' ? 'flush' : 'protruding'
  const rule = data.edge[head]
  const least = leastEdge(diameter, head)
  const note = marginWords(given.optionalNumber('edge'), least, `${rule.d} D`)
  const hole = given.word('head') === 'blind' ? (blindHole(size)?.max ?? diameter) : (finalHoles(size)[0]?.drill.inches ?? diameter)
  return [
    result('edge-centre', length(least), cite(rule.cite, 'worked'), { how: `${rule.d} D`, note, against: fallsShort(given.optionalNumber('edge'), least) && note }),
    result('edge-rim', length(least - hole / 2), cite(rule.cite, 'worked'), { how: `${rule.d} D less half the ${hole.toFixed(4)} hole` }),
  ]
}

function pitches(given: InputReader, diameter: number): ShopResult[] {
  const pitch = given.optionalNumber('pitch')
  const { pitchLeast, rowLeast, rowUsual } = data
  const least = pitchLeast.d * diameter
  const yours = pitch === undefined ? '' : `. Yours is ${Number((pitch / diameter).toFixed(2))} D`
  return [
    result('pitch-least', length(least), cite(pitchLeast.cite, 'worked'), { how: `3 D${yours}`, note: marginWords(pitch, least, '3 D'), against: fallsShort(pitch, least) && marginWords(pitch, least, '3 D') }),
    ...data.pitchUsual.map(({ cite: key, min, max, note }) =>
      result('pitch-usual', min === max ? length(min * diameter) : lengthRange(min * diameter, max * diameter), cite(key, 'worked'), { how: min === max ? `${min} D` : `${min} to ${max} D`, note })),
    result('row-least', length(rowLeast.d * diameter), cite(rowLeast.cite, 'worked'), { how: '2.5 D' }),
    result('row-usual', pitch === undefined ? words('75 % of the pitch') : length(rowUsual.ofPitch * pitch), cite(rowUsual.cite), { how: '0.75 × pitch' }),
  ]
}

function forSheet(given: InputReader): ShopResult[] {
  const sheet = given.optionalNumber('sheet')
  if (sheet === undefined) return []
  const stock = diameterForSheet(sheet)
  return [
    ...data.forSheet.map(({ cite: key, min, max, note }) => {
      const quantity = max === null ? atLeast(min * sheet) : min === max ? length(min * sheet) : lengthRange(min * sheet, max * sheet)
      return result('sheet-diameter', quantity, cite(key, 'worked'), { how: `thickest sheet ${sheet.toFixed(3)}`, note })
    }),
    stock ? result('sheet-stock', length(inchesOf(stock)), cite('diameter-ac', 'worked'), { how: 'first size not under 3 t' })
      : result('sheet-stock', noValue('in'), cite('diameter-ac'), { note: 'no listed size is three times this sheet' }),
  ]
}

function forTube(given: InputReader): ShopResult[] {
  const tube = given.optionalNumber('tube')
  if (tube === undefined) return []
  return [result('tube-diameter', length(data.throughTube.ofOutsideDiameter * tube), cite(data.throughTube.cite, 'worked'), { how: 'one eighth of the outside diameter' })]
}
