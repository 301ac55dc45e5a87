// Results of the torque table. Look-up and arithmetic are torque-rules.ts; where the list has no thread there is no number.
import data from '@/content/shop/torque.json'
import { cite } from './citation'
import { inchesOf } from './exact-fraction'
import type { InputReader } from './shop-input'
import { amount, noValue, result, torque, words } from './shop-result'
import type { ShopResult } from './shop-table'
import { boltTorque, prevailingTorque, threadDiameter, torqueAtNut, wrenchReading, type ExtensionDirection, type NutKind, type TorqueRange } from './torque-rules'

const INCH_THREADS = ['1-14', '1-12', '1-8']

const nutOf = (given: InputReader): NutKind => (given.word('nut') === 'shear' ? 'shear' : 'tension')

/** Table 7-1 and what the measured drag makes of it. */
export function nutTorque(given: InputReader): ShopResult[] {
  const thread = given.word('thread')
  const range = boltTorque(thread, nutOf(given))
  const source = cite(data.table.cite)
  const inch = INCH_THREADS.includes(thread) && 'Table 7-1 lists 1-14, the Army tables 1-12: look which thread is on the bolt'
  if (!range) return [result('torque', noValue('lbf-in'), source, { note: [`the table lists no torque for ${thread}: ask the kit maker`, inch].filter(Boolean).join('; ') })]
  const note = [data.table.condition, range.estimated && 'the AC marks this range as its own estimate', inch].filter(Boolean).join('; ')
  return [result('torque', torque(range.min, range.max), source, { note }), result('most', torque(range.most), source, { note: data.table.condition }), ...drag(given, range)]
}

function drag(given: InputReader, { min, max }: TorqueRange): ShopResult[] {
  const measured = given.optionalNumber('drag')
  if (measured === undefined) return []
  const castle = cite(data.castle.cite, 'worked')
  const how = `drag ${measured} added`
  return [
    result('with-drag', torque(min + measured, max + measured), cite(data.drag.cite, 'worked'), { how }),
    result('castle-start', torque(min + measured), castle, { how: 'minimum and drag' }), result('castle-limit', torque(max + measured), castle, { how: 'maximum and drag' }),
  ]
}

/** Drag of reused locking nuts, and what heat they bear. */
export function locking(thread: string): ShopResult[] {
  const found = prevailingTorque(thread)
  const small = threadDiameter(thread) <= inchesOf(data.fingerTest.upTo) + 1e-9
  return [
    ...found.map(({ cite: key, least }) => result('prevailing', torque(least), cite(key))),
    ...(found.length === 0 ? [result('prevailing', noValue('lbf-in'), cite('prevailing-ac'), { note: `neither list gives a value for ${thread}` })] : []),
    ...(small ? [result('finger-test', words(data.fingerTest.words), cite(data.fingerTest.cite), { how: '3/8 in and under' })] : []),
    ...data.heat.map(({ cite: key, what, degF }) => result('heat', heat(degF), cite(key), { how: what })),
    result('calibration', amount(data.calibration.perYear, 'a year at least'), cite(data.calibration.cite), { note: 'and after abuse or a drop' }),
  ]
}

function heat(degF: number) {
  return { value: { number: degF }, unit: '°F', display: { inch: `${degF} °F`, metric: `${Math.round((degF - 32) / 1.8)} °C` } }
}

/** The wrench with its extension, both ways. */
export function wrench(given: InputReader): ShopResult[] {
  const lever = given.optionalNumber('lever')
  if (lever === undefined) return []
  const extension = given.optionalNumber('extension') ?? 0
  const direction = directionOf(given)
  const source = cite(direction === 'square' ? data.extensionSquare.cite : data.extension.cite, 'worked')
  const how = direction === 'square' ? 'no change at 90 degrees' : `× ${lever} / (${lever} ${direction === 'longer' ? '+' : '-'} ${extension})`
  const set = (value: number): number => wrenchReading(value, lever, extension, direction)
  const [low, high] = targetOf(given)
  const reading = given.optionalNumber('reading')
  return [
    low === undefined ? result('wrench', noValue('lbf-in'), source, { note: 'no torque to set: the table lists none and none was given' })
      : result('wrench', high === undefined ? torque(set(low)) : torque(set(low), set(high)), source, { how, note: targetNote(given) }),
    ...(reading === undefined ? [] : [result('at-nut', torque(torqueAtNut(reading, lever, extension, direction)), source, { how: 'the same turned round' })]),
  ]
}

function directionOf(given: InputReader): ExtensionDirection {
  const word = given.word('direction')
  return word === 'shorter' || word === 'square' ? word : 'longer'
}

/** What must arrive at the nut: the plans' torque, else the table's, with the drag in either case. */
function targetOf(given: InputReader): [low: number | undefined, high?: number] {
  const measured = given.optionalNumber('drag') ?? 0
  const target = given.optionalNumber('target')
  if (target !== undefined) return [target + measured]
  const range = boltTorque(given.word('thread'), nutOf(given))
  return range ? [range.min + measured, range.max + measured] : [undefined]
}

function targetNote(given: InputReader): string {
  const what = given.optionalNumber('target') === undefined ? 'for the torque of Table 7-1' : 'for the torque the plans name'
  return given.optionalNumber('drag') === undefined ? `${what}; add the drag of a locking nut` : `${what} with the drag`
}
