// Finds the measurements of a text: one pass over its lexemes, each reader asked in turn what begins there. Pure; knows no storage and no page.
import type { Finding } from './make-measurement'
import { wireGauge } from './make-measurement'
import type { Measurement } from './measurement'
import { isAttached, numberAt, passageOf, signAt, wordAt, type Passage } from './passage'
import { readDesignation } from './read-designation'
import { readLetterWord, readLoneLetter, readNumberSign, readNumberWord, readQuotedLetter } from './read-drill'
import { readMetricFastener } from './read-metric-fastener'
import { readAnInch, readQuantity } from './read-quantity'

/**
 * Measurements in the order of the text, never overlapping. Linear in the length of the text; any string is taken, and nothing is thrown.
 * A bare fraction or decimal is inches; dates, section codes, plans pages, ratios, times, screw sizes and part numbers are left out.
 */
export function findMeasurements(text: string): Measurement[] {
  const passage = passageOf(text)
  const found: Measurement[] = []
  for (let at = 0; at < passage.lexemes.length;) {
    const finding = readAt(passage, at)
    if (finding) found.push(...finding.measurements)
    at = Math.max(at + 1, finding?.next ?? 0)
  }
  return found
}

function readAt(passage: Passage, at: number): Finding | undefined {
  const lexeme = passage.lexemes[at]
  switch (lexeme?.type) {
    case 'whole': case 'decimal': return readQuantity(passage, at)
    case 'fraction': return readGaugeFraction(passage, at) ?? readQuantity(passage, at)
    case 'sign': return readSignAt(passage, at, lexeme.text)
    case 'word': return readWordAt(passage, at, lexeme.text)
    default: return undefined
  }
}

function readSignAt(passage: Passage, at: number, sign: string): Finding | undefined {
  if (sign === '#' || sign === '№') return readNumberSign(passage, at)
  return '-−–'.includes(sign) ? readNegative(passage, at) : '"“‘\''.includes(sign) ? readQuotedLetter(passage, at) : undefined
}

function readWordAt(passage: Passage, at: number, word: string): Finding | undefined {
  if (word.length === 1) {
    const single = word === 'm' ? readMetricFastener(passage, at) : readLoneLetter(passage, at)
    if (single) return single
  }
  switch (word) {
    case 'an': { const read = readDesignation(passage, at) ?? readAnInch(passage, at); if (read) return read; break }
    case 'ms': case 'nas': case 'ad': case 'dd': { const read = readDesignation(passage, at); if (read) return read; break }
    case 'awg': return readGaugeBehind(passage, at) ?? readCode(passage, at, word)
    case 'number': case 'no': case 'nr': case 'num': return readNumberWord(passage, at)
    case 'letter': case 'size': return readLetterWord(passage, at)
    case 'minus': return readNegative(passage, at)
    case 'http': case 'https': case 'www': return readAddress(passage, at)
    default:
  }
  return readCode(passage, at, word) ?? readQuantity(passage, at)
}

/** A minus belongs only to heat and angles; in front of anything else it is a dash, and the number is read without it. */
function readNegative(passage: Passage, at: number): Finding | undefined {
  const behind = passage.lexemes[at + 2]
  if (!numberAt(passage, at + 1) || !behind || behind.gap === 2 || (behind.type === 'sign' && behind.gap === 1 && behind.text !== '°')) return undefined
  const finding = readQuantity(passage, at)
  return finding?.measurements[0]?.start === passage.lexemes[at]?.start ? finding : undefined
}

const longestPrefix = 5
const noPrefix = new Set([
  'x', 'by', 'to', 'of', 'is', 'and', 'or', 'at', 'dia', 'diam', 'ca',
  'about', 'under', 'over', 'the', 'a', 'minus', 'plus', 'until', 'half', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten',
])

/** W3-2, F-2/3, MS21042-3: a name of letters and digits is passed over whole. */
function readCode(passage: Passage, at: number, word: string): Finding | undefined {
  if (word.length > longestPrefix || noPrefix.has(word)) return undefined
  const digits = signAt(passage, at + 1) === '-' && isAttached(passage, at + 1) ? at + 2 : at + 1
  if (!isAttached(passage, digits) || (!numberAt(passage, digits) && passage.lexemes[digits]?.type !== 'code')) return undefined
  let next = digits + 1
  for (let lexeme = passage.lexemes[next]; lexeme && lexeme.gap === 0; lexeme = passage.lexemes[next]) {
    const joins = lexeme.type === 'sign' && '-./'.includes(lexeme.text) && isAttached(passage, next + 1) && passage.lexemes[next + 1]?.type !== 'sign'
    if (lexeme.type === 'sign' && !joins) break
    next += joins ? 2 : 1
  }
  return { measurements: [], next }
}

/** A web address is passed over whole. */
function readAddress(passage: Passage, at: number): Finding {
  let next = at + 1
  while (isAttached(passage, next)) next += 1
  return { measurements: [], next }
}

/** AWG 22, AWG22, AWG 4/0. */
function readGaugeBehind(passage: Passage, at: number): Finding | undefined {
  const place = signAt(passage, at + 1) === '-' || signAt(passage, at + 1) === '#' ? at + 2 : at + 1
  const gauge = gaugeNumber(passage, place)
  return gauge === undefined ? undefined : { measurements: [wireGauge(passage, at, place + 1, gauge)], next: place + 1 }
}

/** 2/0 AWG. */
function readGaugeFraction(passage: Passage, at: number): Finding | undefined {
  const number = numberAt(passage, at)
  if (number?.d !== 0 || wordAt(passage, at + 1) !== 'awg') return undefined
  const gauge = gaugeNumber(passage, at)
  return gauge === undefined ? undefined : { measurements: [wireGauge(passage, at, at + 2, gauge)], next: at + 2 }
}

function gaugeNumber(passage: Passage, at: number): number | undefined {
  const number = numberAt(passage, at)
  if (number?.type === 'whole' && number.n <= 40) return number.n
  return number?.type === 'fraction' && number.d === 0 && number.n >= 1 && number.n <= 4 ? 1 - number.n : undefined
}
