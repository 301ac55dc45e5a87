// Results of the rivet table about the rivet itself: hole, length, shop head, alloy, part number. Edge and pitch are rivet-layout.ts.
import data from '@/content/shop/rivets.json'
import { cite, COMMON_PRACTICE, HOLE_NOTE } from './citation'
import { findDrill } from './drill-series'
import { drillNames } from './drill-table'
import { inchesOf } from './exact-fraction'
import { decodeRivet, rivetDesignation, rivetSizeWords } from './rivet-designation'
import { blindHole, finalHoles, nearestStockLength, nextStockLength, pilotHoles, replacementDiameter, rivetLength, shopHead } from './rivet-rules'
import type { InputReader } from './shop-input'
import { drillSize, length, noValue, result, words, type Quantity } from './shop-result'
import type { ShopResult } from './shop-table'

/** Hole, length and shop head of the rivet that was chosen. */
export function rivetBody(given: InputReader): ShopResult[] {
  const size = given.word('diameter')
  if (given.word('head') === 'blind') return blindRivet(size)
  return [...holes(size), ...lengths(given, inchesOf(size)), ...heads(inchesOf(size), given.word('alloy'))]
}

function holes(size: string): ShopResult[] {
  const final = finalHoles(size).map(({ cite: key, drill }) => result('hole', drillSize(drill, drillNames(drill)), cite(key), { note: HOLE_NOTE, how: `the drill for D = ${size}` }))
  const pilot = pilotHoles(size).map(({ cite: key, drill }) => result('pilot', drillSize(drill, drillNames(drill)), cite(key), { how: 'drilled first' }))
  const cleco = data.cleco.diameter === size ? findDrill(data.cleco.drill) : null
  return [
    ...(final.length > 0 ? final : [result('hole', noValue('in'), cite('hole-handbook'), { note: `no source here lists a hole for a ${size} in rivet` })]),
    ...pilot,
    ...(cleco ? [result('pilot', drillSize(cleco), COMMON_PRACTICE, { how: 'temporary fastener size, drilled first' })] : []),
  ]
}

function blindRivet(size: string): ShopResult[] {
  const hole = blindHole(size)
  const drill = findDrill(hole?.drill ?? '')
  const none = (name: string): ShopResult => result(name, noValue('in'), COMMON_PRACTICE, { note: 'go by the maker’s grip range for the blind rivet in hand' })
  if (!hole || !drill) return [result('hole', noValue('in'), cite('hole-blind'), { note: `the chart lists no ${size} in blind rivet` }), none('length')]
  const quantity: Quantity = { ...drillSize(drill), value: { number: drill.inches, min: hole.min, max: hole.max, label: drill.name } }
  return [result('hole', quantity, cite('hole-blind'), { note: HOLE_NOTE, how: `hole ${hole.min.toFixed(3)} to ${hole.max.toFixed(3)} in` }), none('length')]
}

function lengths(given: InputReader, diameter: number): ShopResult[] {
  const [grip, head, alloy] = [given.number('stack'), given.word('head') === 'flush' ? 'flush' as const : 'universal' as const, given.word('alloy')]
  const needed = rivetLength(grip, diameter)
  const plain = grip + data.length.allowanceD * diameter
  const more = needed - plain
  const how = `${grip.toFixed(3)} + 1.5 D = ${plain.toFixed(3)}${more > 0 ? ` + ${more.toFixed(3)} for the long grip` : ''}`
  const stock = (name: string, inches: number, key: string): ShopResult => {
    const code = { 2017: 'D', 2024: 'DD' }[alloy] ?? alloy
    const label = /^\d/.test(code) ? undefined : rivetDesignation(head, code, diameter, inches)
    const quantity = length(inches)
    const off = inches - needed
    return result(name, { ...quantity, value: { number: inches, ...(label ? { label } : {}) } }, key === '' ? COMMON_PRACTICE : cite(key, 'worked'),
      { how: Math.abs(off) < 5e-4 ? 'to the length needed' : `${Math.abs(off).toFixed(3)} in ${off > 0 ? 'longer' : 'shorter'} than needed`, note: 'try one in scrap of the same thickness' })
  }
  return [
    result('length', length(needed), cite(more > 0 ? 'rivet-length-long' : 'rivet-length', 'worked'), { how }),
    stock('rivet', nearestStockLength(needed), ''),
    stock('rivet-next', nextStockLength(needed), 'rivet-length-up'),
  ]
}

function heads(diameter: number, alloy: string): ShopResult[] {
  const { width, height, leastWidth, leastHeight } = shopHead(diameter, alloy)
  const printed = data.shopHead.printed.some(([size]) => inchesOf(String(size)) === diameter)
  const [drawn, least] = [cite('shop-head', printed ? undefined : 'worked'), cite('shop-head-least', 'worked')]
  return [
    result('head-width', length(width), drawn, { how: '1.5 D wide' }), result('head-height', length(height), drawn, { how: '0.5 D high' }),
    result('head-width-least', length(leastWidth), least, { how: alloy === '7050' ? '1.4 D for 7050' : '1.3 D' }), result('head-height-least', length(leastHeight), least, { how: '0.3 D' }),
  ]
}

/** What the alloy is, and which larger 2117 rivet may stand in for it. */
export function alloyWords(given: InputReader): ShopResult[] {
  const code = given.word('alloy')
  const known = data.alloys.find((row) => row.code === code)
  if (known) return [result('alloy', words(`${known.alloy}, head mark: ${known.mark}`), cite(known.cite))]
  const size = replacementDiameter(code, inchesOf(given.word('diameter')))
  const rule = data.replace.rows.find((row) => row.alloy === code)
  if (!rule) return []
  return [size === null
    ? result('replacement', noValue('in'), cite('replace-2117'), { note: `the rule ends at a ${rule.upTo} in ${code} rivet` })
    : result('replacement', length(size), cite('replace-2117', 'worked'), { how: 'one size (1/32 in) larger', note: 'for general repairs; edge distance and spacing must still be kept' })]
}

/** How a part number reads. */
export function partWords(given: InputReader): ShopResult[] {
  const decoded = decodeRivet(given.optionalWord('part') ?? '')
  if (!decoded) return []
  const alloy = decoded.alloy ? `, ${decoded.alloy}` : ''
  return [result('part', words(`${decoded.head} head${alloy}, ${rivetSizeWords(decoded)}; ${decoded.msNumber}`), cite('rivet-code', 'worked'))]
}
