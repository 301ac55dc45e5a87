// Numbers with a unit, ranges, dimensions (24 x 60 in), and numbers that are inches without saying so. Drills and designations are read elsewhere.
import { isBareLength } from './bare-length'
import { nothing, quantity, wireGauge, type Finding } from './make-measurement'
import type { Measurement, UnitName } from './measurement'
import { hasWordBefore, isAttached, numberAt, signAt, wordAt, type Passage } from './passage'
import { readUnsignedDrill } from './read-drill'
import { readNumber, type NumberRead } from './read-number'
import { readThread } from './read-thread'
import { readUnit } from './read-unit'
import { isLabelled, standsFree } from './stands-free'
import { enlargingWords, partNouns, sheetNouns } from './surroundings'
import { units, type LinearUnit, type Ratio } from './units'

/** A number with the unit right behind it, if it has one. */
interface Value {
  number: NumberRead
  unit: UnitName | undefined
  from: number
  next: number
  value: Ratio
  /** 3/16, 5' 6": what the decimal says less well. */
  text: string | undefined
  /** Place of a minus in front, that only heat and angles may have; -1 without. */
  minus: number
}

const isBelow = (a: Ratio, b: Ratio): boolean => a.n * b.d < b.n * a.d

/** What begins with the number at a place; always moves on. Undefined if no number begins there. */
export function readQuantity(passage: Passage, at: number): Finding | undefined {
  const first = readValue(passage, at)
  if (!first) return undefined
  const place = first.number.from
  if (!standsFree(passage, place, first.number.form)) return nothing(place + 1)
  if (!first.unit && isLabelled(passage, place, first.number)) return nothing(place + 1)
  return readThread(passage, place) ?? readDimensions(passage, first) ?? readRange(passage, first) ?? readSingle(passage, first)
}

function readValue(passage: Passage, at: number): Value | undefined {
  const negative = isMinus(passage, at)
  const plus = signAt(passage, at) === '+' && isAttached(passage, at + 1)
  const number = readNumber(passage, negative || plus ? at + 1 : at)
  if (!number) return undefined
  const read = readUnit(passage, number.next)
  const unit = read && fits(passage, number, read.unit) ? read : undefined
  const plain: Value = {
    number, unit: unit?.unit, from: number.from, next: unit?.next ?? number.next, value: number,
    text: number.d > 1 && number.form !== 'decimal' ? number.text : undefined, minus: negative ? at : -1,
  }
  if (!unit) return plain
  if (negative) return signed(plain, unit.unit)
  return unit.unit === 'ft' ? withInches(passage, plain) : unit.unit === '°' ? withMinutes(passage, plain) : plain
}

/** Below zero if the unit can be; in front of a length a minus is a dash. */
const signed = (value: Value, unit: UnitName | undefined): Value =>
  value.minus >= 0 && unit?.startsWith('°') ? { ...value, from: value.minus, value: { n: -value.number.n, d: value.number.d } } : value

const signs = new Set(['-', '−', '–'])

function isMinus(passage: Passage, at: number): boolean {
  if (wordAt(passage, at) === 'minus') return numberAt(passage, at + 1) !== undefined
  return signs.has(signAt(passage, at)) && isAttached(passage, at + 1) && numberAt(passage, at + 1) !== undefined && (!isAttached(passage, at) || signAt(passage, at - 1) === '(')
}

/** Half a bar is stock; said in words, a unit must be a word too. */
function fits(passage: Passage, number: NumberRead, unit: UnitName): boolean {
  if (unit === 'bar' && (number.form === 'fraction' || number.form === 'mixed' || number.text.startsWith('.'))) return false
  if (number.form === 'whole' && unit === 'in' && isDashNumber(passage, number)) return false
  if (number.form !== 'words') return true
  // Two feet may be a stand's.
  if (unit === 'ft') return footWords.has(wordAt(passage, number.next + 1)) || partNouns.has(wordAt(passage, number.next + 1))
  const word = wordAt(passage, signAt(passage, number.next) === '-' ? number.next + 1 : number.next)
  if (unit === 'bar') return word === 'bar' && number.d === 1 && number.n > 1
  return unit !== 'AWG' && (word.length > 2 || ['mm', 'cm', 'of', 'an', 'a', 'ft', 'in'].includes(word) && !(word === 'in' && unit === 'in'))
}

/** "A -6 in scrap": a rivet's dash number, with a preposition behind it. */
const isDashNumber = (passage: Passage, { from, next }: NumberRead): boolean =>
  signAt(passage, from - 1) === '-' && isAttached(passage, from) && !isAttached(passage, from - 1) && from > 1 && wordAt(passage, next) === 'in'

const footWords = new Set(['of', 'from', 'away', 'by', 'above', 'below', 'behind', 'or', 'and', 'more', 'less', 'longer', 'shorter', 'square'])

/** 5' 6", 4 ft 3 in, 6'2: one length, kept in inches. */
function withInches(passage: Passage, feet: Value): Value {
  // 2'-6" has a hyphen between.
  const at = signAt(passage, feet.next) === '-' && isAttached(passage, feet.next) && isAttached(passage, feet.next + 1) ? feet.next + 1 : feet.next
  const number = readNumber(passage, at)
  if (!number || number.form === 'words' || passage.lexemes[at]?.gap === 2) return feet
  const unit = readUnit(passage, number.next)
  if (unit?.unit !== 'in' || number.n >= 12 * number.d) return feet
  return { ...feet, unit: 'in', next: unit.next, value: { n: 12 * feet.value.n * number.d + number.n * feet.value.d, d: feet.value.d * number.d }, text: `${feet.number.text}' ${number.text}"` }
}

/** 1° 30′ */
function withMinutes(passage: Passage, degrees: Value): Value {
  const number = numberAt(passage, degrees.next)
  if (!number || number.type !== 'whole' || number.n >= 60 || !["'", '′', '’'].includes(signAt(passage, degrees.next + 1)) || !isAttached(passage, degrees.next + 1)) return degrees
  return { ...degrees, next: degrees.next + 2, value: { n: 60 * degrees.value.n + number.n * degrees.value.d, d: 60 * degrees.value.d } }
}

const betweenNumbers = new Set(['x', '×', '*', 'by', 'or'])
const mostDimensions = 4

/** 24 x 60 inches, 8 or 10 mm: the last one's unit is everybody's. */
function readDimensions(passage: Passage, first: Value): Finding | undefined {
  if (first.unit) return undefined
  const values = [first]
  for (let last = first; !last.unit && values.length < mostDimensions;) {
    const joined = wordAt(passage, last.next) || signAt(passage, last.next)
    const value = betweenNumbers.has(joined) ? readValue(passage, last.next + 1) : undefined
    if (!value || value.number.form === 'words') break
    values.push(value)
    last = value
  }
  const last = values.at(-1)
  const unit = last?.unit
  // 2x4x6 without a unit: whole numbers are no lengths, and need not be read again one by one.
  if (last && !unit && values.length > 1 && values.every(({ number }) => number.form === 'whole')) return nothing(last.from)
  if (!unit || unit === 'AWG' || values.length < 2 || !last || (wordAt(passage, first.next) !== 'or' && units[unit].kind !== 'length')) return undefined
  return { measurements: values.map((value) => quantity(passage, value.from, value.next, value.unit === undefined ? unit : linear(value.unit), value.value, value.text)), next: last.next }
}

const linear = (unit: UnitName): LinearUnit => (unit === 'AWG' ? 'in' : unit)

function readRange(passage: Passage, lower: Value): Finding | undefined {
  const second = readUpperEnd(passage, lower)
  if (!second) return undefined
  const first = lower.unit ? lower : signed(lower, second.unit)
  const unit = first.unit ?? second.unit
  const bare = !unit && first.number.form !== 'whole' && isBareLength(passage, second.number, first.from, second.next)
  if ((first.unit && first.unit !== second.unit) || (!unit && !bare)) return undefined
  if (unit === 'AWG' && !(isGauge(first.number) && isGauge(second.number))) return undefined
  if (unit === 'AWG') return { measurements: [wireGauge(passage, first.from, second.next, first.value.n, second.value.n)], next: second.next }
  if (!isBelow(first.value, second.value)) return undefined
  const known = unit ?? 'in'
  if (wordAt(passage, first.next) === 'to' && units[known].kind === 'length' && hasWordBefore(passage, first.from, 4, enlargingWords)) {
    const both = [first, second].map(({ from, next, value, text }) => quantity(passage, from, next, known, value, text))
    return { measurements: both, next: second.next }
  }
  const text = first.text ?? second.text ? `${first.text ?? first.number.text}–${second.text ?? second.number.text}` : undefined
  const range = quantity(passage, first.from, second.next, known, first.value, text, second.value)
  return { measurements: [range], next: second.next }
}

const rangeWords = new Set(['to', 'thru', 'through'])
const dashes = new Set(['-', '–', '—', '−', '‑', '‐', '…'])

function readUpperEnd(passage: Passage, first: Value): Value | undefined {
  const at = first.next
  if (passage.lexemes[at]?.gap === 2) return undefined
  const word = wordAt(passage, at)
  if (rangeWords.has(word) || (word === 'and' && isBetween(passage, first.from))) return readValue(passage, at + 1)
  if (word === 'up' && wordAt(passage, at + 1) === 'to') return readValue(passage, at + 2)
  if (!dashes.has(signAt(passage, at))) return undefined
  const tight = isAttached(passage, at) && isAttached(passage, at + 1)
  const loose = !isAttached(passage, at) && !isAttached(passage, at + 1)
  // The dash has been read; the number behind it is not negative.
  const second = (tight || loose) && numberAt(passage, at + 1) ? readValue(passage, at + 1) : undefined
  return loose && !second?.unit ? undefined : second
}

const isBetween = (passage: Passage, at: number): boolean => wordAt(passage, at - 1) === 'between' || (wordAt(passage, at - 2) === 'between' && ['the', 'a'].includes(wordAt(passage, at - 1)))

function readSingle(passage: Passage, { number, unit, from, next, value, text }: Value): Finding {
  if (unit === 'AWG') return isGauge(number) ? { measurements: [wireGauge(passage, from, next, value.n)], next } : nothing(next)
  if (unit) return { measurements: [quantity(passage, from, next, unit, value, text)], next }
  const drill = readUnsignedDrill(passage, number)
  if (drill) return drill
  const sheet = readSheet(passage, number)
  if (sheet) return { measurements: [sheet], next: number.next }
  if (!isBareLength(passage, number)) return nothing(number.form === 'words' ? number.from + 1 : number.next)
  return { measurements: [quantity(passage, from, next, 'in', value, text)], next }
}

const isGauge = ({ form, n }: NumberRead): boolean => form === 'whole' && n <= 40

/** 032 sheet. */
function readSheet(passage: Passage, number: NumberRead): Measurement | undefined {
  if (number.form !== 'whole' || !/^0\d\d$/.test(number.text) || !sheetNouns.has(wordAt(passage, number.next))) return undefined
  return quantity(passage, number.from, number.next, 'in', { n: number.n, d: 1000 })
}

/** An inch, an inch and a half, an inch and a quarter. */
export function readAnInch(passage: Passage, at: number): Finding | undefined {
  if (wordAt(passage, at + 1) !== 'inch' || passage.lexemes[at + 1]?.gap !== 1) return undefined
  const part = wordAt(passage, at + 2) === 'and' && wordAt(passage, at + 3) === 'a' ? readNumber(passage, at + 4) : undefined
  if (!part || part.d === 1) return { measurements: [quantity(passage, at, at + 2, 'in', { n: 1, d: 1 })], next: at + 2 }
  return { measurements: [quantity(passage, at, part.next, 'in', { n: part.d + part.n, d: part.d }, `1 ${part.n}/${part.d}`)], next: part.next }
}
