// Results of the wire table about size: current, drop, longest run, the wire in hand.
import data from '@/content/shop/wire.json'
import { ARITHMETIC, cite } from './citation'
import type { InputReader } from './shop-input'
import { amount, noValue, result, words, type Quantity } from './shop-result'
import type { ShopResult } from './shop-table'
import { allowedDrop, findWire, longestRun, thicker, voltageDrop, warmRun, wireForCurrent, wireForDrop, type Wire, type WireRating } from './wire-rules'

const gauge = (wire: Wire): Quantity => ({ ...words(`AWG ${wire.awg}`), unit: 'AWG' })
const feet = (value: number): Quantity => ({ value: { number: value }, unit: 'ft', display: { inch: `${value.toFixed(1)} ft`, metric: `${(value * 0.3048).toFixed(2)} m` } })

function ratingOf(given: InputReader): WireRating {
  const word = given.word('rating')
  return word === '105' || word === '200' ? word : '150'
}

/** Size for the current and the drop, and what the chosen wire does. */
export function sizing(given: InputReader): ShopResult[] {
  const [amps, run, rating] = [given.number('current'), given.number('length'), ratingOf(given)]
  const own = given.optionalNumber('drop')
  const duty = given.word('duty') === 'intermittent' ? 'intermittent' : 'continuous'
  const allowed = own ?? allowedDrop(Number(given.word('system')), duty) ?? 0
  const [byCurrent, byDrop] = [wireForCurrent(amps, rating), wireForDrop(allowed, run, amps)]
  const [table, drop] = [cite(data.sizes.cite), cite(data.drop.cite, 'worked')]
  const past = 'past the end of the table, AWG 0000'
  return [
    byCurrent && byDrop ? result('size', gauge(thicker(byCurrent, byDrop)), drop, { how: 'the thicker of the two', note: 'the fuse or breaker protects the wire: pick it to the wire' }) : result('size', noValue('AWG'), table, { note: past }),
    byCurrent ? result('size-current', gauge(byCurrent), table, { how: `${byCurrent.amps[rating]} A at ${rating} °C` }) : result('size-current', noValue('AWG'), table, { note: past }),
    byDrop ? result('size-drop', gauge(byDrop), drop, { how: `${voltageDrop(byDrop, run, amps).toFixed(3)} V of ${allowed} V` }) : result('size-drop', noValue('AWG'), drop, { note: past }),
    result('allowed', amount(allowed, 'V'), own === undefined ? cite(data.allowed.cite) : ARITHMETIC, { how: own === undefined ? `${given.word('system')} V, ${duty}` : 'as you gave it' }),
    ...(byCurrent && byDrop ? runs(thicker(byCurrent, byDrop), given, allowed, '') : []),
    ...inHand(given, allowed, rating),
  ]
}

function runs(wire: Wire, given: InputReader, allowed: number, prefix: '' | 'hand-'): ShopResult[] {
  const [amps, run, celsius] = [given.number('current'), given.number('length'), given.optionalNumber('temperature')]
  const source = cite(data.drop.cite, 'worked')
  const longest = longestRun(wire, allowed, amps)
  return [
    result(`${prefix}drop`, amount(voltageDrop(wire, run, amps), 'V', 3), source, { how: `${wire.ohmsPer1000ft} ohm/1000 ft × ${run} ft × ${amps} A` }),
    result(`${prefix}longest`, feet(longest), source, { how: `AWG ${wire.awg} at 20 °C` }),
    ...(celsius === undefined || prefix ? [] : [result('longest-warm', feet(warmRun(longest, celsius)), cite(data.warm.cite, 'worked'), { how: `254.5 L / (234.5 + ${celsius})` })]),
  ]
}

function inHand(given: InputReader, allowed: number, rating: WireRating): ShopResult[] {
  const wire = findWire(given.optionalWord('awg') ?? '')
  if (!wire) return []
  const table = cite(data.sizes.cite)
  const size = Number(wire.awg)
  const strands = wire.awg.startsWith('0') ? undefined : data.strands.rows.find((row) => size <= row.from && size >= row.to)
  const carries = wire.amps[rating]
  const less = carries < given.number('current') && 'less than the current you gave'
  return [
    result('hand-current', amount(carries, 'A'), table, { how: `AWG ${wire.awg}, ${rating} °C`, note: less, against: less }),
    ...runs(wire, given, allowed, 'hand-'),
    result('resistance', amount(wire.ohmsPer1000ft, 'ohm/1000 ft'), table), result('area', amount(wire.circularMils, 'circ mil'), table),
    strands ? result('strands', words(`${strands.nicked} nicked, ${strands.broken} broken of ${strands.strands}`), cite(data.strands.cite)) : result('strands', noValue('strands'), cite(data.strands.cite), { note: 'the table lists AWG 24 to 4' }),
  ]
}
