// One size said twice: 1/8 in = 3.2 mm, 20 ft-lb = 27 N·m, #30 is 0.1285, and which of two is the larger.
import { cite } from '../../shop/citation'
import { convert } from '../../shop/unit-conversion'
import { finding, type Finding } from '../judge'
import { NEWTON_METRES_PER_INCH_POUND, type Mark } from '../marks'
import { between, dimensionOf, nounOf, type Statement } from '../statement'
import type { Kind } from './kind'

const words = (text: string): ReadonlySet<string> => new Set(text.split(/\s+/))
const equators = words('= ≈ ~ is are equals equal comes works converts same makes means i.e that’s thats gives becomes')
const filler = words(`about roughly approximately around nearly near almost just a an the to out at as in of drill drills bit bits hole holes or , ( : which that it same exactly also size number only close very inch thick sheet letter well
  hair bit little touch tad shade thou over under above below bigger larger smaller less more than greater up down on by slightly barely wider thinner thicker still shy short per = ≈ ~ is are equals equal comes works converts makes means i.e gives becomes decimal rounds rounded and exact`)
const loose = words('about roughly approximately around nearly near almost ≈ ~ close say')
const lessWords = words('under below smaller less shy short thinner')
const moreWords = words('over above bigger larger more greater up wider thicker')
/** Our own way of writing a drill with its size: nothing is claimed by it. */
const ours = /^\s*·\s*$/

export const unitEquation: Kind = ({ statement }) => {
  const marks = statement.marks.filter(({ dimension, what }) => dimension !== '' && ['length', 'drill', 'torque', 'pressure', 'temperature', 'amount'].includes(what))
  return marks.slice(1).flatMap((right, index): Finding[] => {
    const left = marks[index]
    if (!left || left.standing === 'subject' || right.standing === 'subject' || left.dimension !== right.dimension || hasBetween(statement, left, right)) return []
    return relate(statement, left, right)
  })
}

const hasBetween = (statement: Statement, a: Mark, b: Mark): boolean => statement.marks.some((mark) => mark.start >= a.end && mark.end <= b.start)

function relate(statement: Statement, left: Mark, right: Mark): Finding[] {
  const text = between(statement, left, right)
  if (ours.test(text) || text.length > 60) return []
  const tokens = text.match(/[\p{L}.]+|[^\s\p{L}]/gu) ?? []
  if (!tokens.every((token) => filler.has(token) || equators.has(token) || lessWords.has(token) || moreWords.has(token))) return []
  const less = tokens.some((token) => lessWords.has(token))
  const more = tokens.some((token) => moreWords.has(token))
  if (less !== more && isOneThing(statement, right) && tokens.some((token) => ['is', 'are', ',', 'than', 'hair', 'bit', 'just', 'slightly', 'touch'].includes(token))) return [compared(left, right, less)]
  if (less || more || !isEquation(tokens, left, right)) return []
  if (left.unit === right.unit && !isSaidTwice(left, right)) return []
  if (!isOneThing(statement, right) && left.unit === right.unit) return []
  return [equated(left, right, tokens.some((token) => loose.has(token)))]
}

/** "1/8 is .063 tall" speaks of something else than 1/8. */
const isOneThing = (statement: Statement, right: Mark): boolean => ['', 'drill', 'hole'].includes(nounOf(statement, right)) && !['height', 'length', 'depth'].includes(dimensionOf(statement, right))

function isEquation(tokens: readonly string[], left: Mark, right: Mark): boolean {
  if (tokens.some((token) => equators.has(token))) return true
  const [first] = tokens
  if (first === 'in' || first === 'to' || first === 'per') return tokens.length === 1 && right.low === right.high && /^(?:an?|one|1|each)\b/i.test(right.raw) && left.unit !== right.unit
  return (first === '(' || (first === 'or' && tokens.length === 1)) && (left.unit !== right.unit || left.what === 'drill')
}

/** Two inch sizes say one thing only as a name and a decimal, or a fraction and a decimal. */
const isSaidTwice = (left: Mark, right: Mark): boolean => left.dimension === 'length' && (left.what === 'drill') !== (right.what === 'drill') || (left.raw.includes('/') !== right.raw.includes('/') && left.dimension === 'length' && left.what === right.what)

const shown = (value: number, unit: string): string => `${Number(value.toPrecision(4))} ${unit}`.trim()

function equated(left: Mark, right: Mark, isLoose: boolean): Finding {
  const [low, high] = [inUnitOf(left, left.low, right), inUnitOf(left, left.high, right)]
  if (low === null || high === null) return finding([left, right], 'cannot-tell', 'units')
  const exactStep = left.dimension === 'amount' || !right.step ? inStep(left, right) : right.step
  // Twenty times apart they are two things: "0.1 degree over 8 ft is 0.17 in".
  if (Math.abs(Math.log(Math.abs(low / right.low) || 1)) > Math.log(20) && right.dimension !== 'temperature') return finding([left, right], 'cannot-tell', 'units')
  const slack = Math.max(exactStep / 2, 1e-9) * (1 + 1e-6)
  const off = Math.max(Math.abs(low - right.low), left.high === left.low && right.high !== right.low ? 0 : Math.abs(high - right.high))
  const relative = right.dimension === 'temperature' ? off / 50 : off / Math.abs(low || 1)
  const isDrill = left.what === 'drill' || right.what === 'drill'
  const citation = isDrill ? cite('drill-number') : cite('nist')
  const expected = isDrill ? `${(left.what === 'drill' ? left : right).raw} · ${(left.what === 'drill' ? left : right).low.toFixed(4)} in` : shown(outward(low, right), right.unit)
  const table = isDrill ? 'drill' : 'units'
  const agrees = off <= slack ? relative <= (isLoose ? 0.06 : 0.031) : isLoose && relative <= 0.035
  const conflicts = isDrill && !isLoose && right.unit === 'in' && left.unit === 'in' ? off > slack : relative > (isLoose ? 0.07 : 0.01) && off > slack
  return finding([left, right], agrees ? 'agrees' : conflicts ? 'conflicts' : 'cannot-tell', table, expected, citation)
}

/** A rounded left side may be the approximate one: 0.157 is 4 mm, 0.81 mm is 0.032. */
const inStep = (left: Mark, right: Mark): number => Math.abs((inUnitOf(left, left.low + left.step, right) ?? 0) - (inUnitOf(left, left.low, right) ?? 0))

/** Sizes, torques and pressures are held in one unit already; temperatures and amounts are converted. */
function inUnitOf(left: Mark, value: number, right: Mark): number | null {
  if (left.what === 'amount') return convert(value, left.unit, right.unit)
  if (left.what !== 'temperature' || left.unit === right.unit) return value
  return right.unit === '°C' ? (value - 32) / 1.8 : value * 1.8 + 32
}

const perUnit: Record<string, number> = { mm: 25.4, cm: 2.54, m: 0.0254, ft: 1 / 12, yd: 1 / 36, thou: 1000, 'ft-lb': 1 / 12, 'oz-in': 16, 'N·m': NEWTON_METRES_PER_INCH_POUND, psi: 1 / 6894.757293168, bar: 1e-5, kPa: 1e-3, MPa: 1e-6, hPa: 1e-2, mbar: 1e-2, inHg: 1 / 3386.389 }
const outward = (value: number, { unit, what }: Mark): number => (what === 'amount' || what === 'temperature' ? value : value * (perUnit[unit] ?? 1))

function compared(left: Mark, right: Mark, less: boolean): Finding {
  const value = inUnitOf(left, left.low, right)
  if (value === null) return finding([left, right], 'cannot-tell', 'units')
  const holds = less ? value < right.low - 1e-9 : value > right.low + 1e-9
  const equal = Math.abs(value - right.low) <= (left.dimension === 'length' ? 0.0004 : Math.max(left.step, right.step) / 2) + 1e-9
  const isDrill = left.what === 'drill' || right.what === 'drill'
  return finding([left, right], holds ? 'agrees' : equal ? 'cannot-tell' : 'conflicts', isDrill ? 'drill' : 'units', `${left.raw} is ${value < right.low ? 'smaller' : 'larger'} than ${right.raw}`, cite(isDrill ? 'drill-number' : 'nist'))
}
