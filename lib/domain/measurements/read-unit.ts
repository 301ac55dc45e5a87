// The unit behind a number: marks, abbreviations and words, joined by nothing, a space or a hyphen. What the number is, is decided elsewhere.
import type { UnitName } from './measurement'
import { isAttached, isNumber, numberAt, signAt, wordAt, type Passage } from './passage'
import { placeWords } from './surroundings'

export interface UnitRead { unit: UnitName; next: number }

/** Words that are a unit by themselves. Those that may become another with the next word are in `joining`. */
const plain = new Map<string, UnitName>(Object.entries({
  mm: 'mm', millimetre: 'mm', millimetres: 'mm', millimeter: 'mm', millimeters: 'mm', cm: 'cm', centimetre: 'cm', centimetres: 'cm', centimeter: 'cm', centimeters: 'cm',
  metre: 'm', metres: 'm', meter: 'm', meters: 'm', micron: 'µm', microns: 'µm', 'µm': 'µm', 'μm': 'µm', thou: 'thou', thous: 'thou', mil: 'thou', mils: 'thou',
  yd: 'yd', yard: 'yd', yards: 'yd', psi: 'psi', psig: 'psi', ksi: 'ksi', mbar: 'mbar', millibar: 'mbar', kpa: 'kPa', hpa: 'hPa', mpa: 'MPa', inhg: 'inHg',
  nm: 'N·m', inlb: 'in-lb', inlbs: 'in-lb', ftlb: 'ft-lb', ftlbs: 'ft-lb', degf: '°F', degc: '°C', fahrenheit: '°F', celsius: '°C', awg: 'AWG',
} satisfies Record<string, UnitName>))

const inchWords = new Set(['in', 'inch', 'inches'])
const footWords = new Set(['ft', 'foot', 'feet'])
const poundWords = new Set(['lb', 'lbs', 'lbf', 'pound', 'pounds'])
/** in/lb is no ratio: everybody writes it for in-lb. */
const joiners = new Set(['-', '·', '⋅', '•', '∙', '.', '*', '‐', '‑', '–', '/'])
const times = new Set(['s', 'sec', 'second', 'min', 'minute', 'h', 'hr', 'hour'])

/** The unit that begins at a place, right behind a number; undefined if the number has none that is known. */
export function readUnit(passage: Passage, at: number): UnitRead | undefined {
  const lexeme = passage.lexemes[at]
  if (!lexeme || lexeme.gap === 2) return undefined
  if (lexeme.type === 'sign') return readMark(passage, at, lexeme.text)
  return lexeme.type === 'word' ? whole(passage, readWord(passage, at)) : undefined
}

function readMark(passage: Passage, at: number, sign: string): UnitRead | undefined {
  const attached = isAttached(passage, at)
  if (sign === '°' || sign === 'º') return readDegree(passage, at + 1, '°')
  if (sign === '℃' || sign === '℉') return { unit: sign === '℃' ? '°C' : '°F', next: at + 1 }
  if (!attached) return undefined
  if (sign === '″' || ((sign === '"' || sign === '”') && !passage.closingQuotes.has(at))) return { unit: 'in', next: at + 1 }
  if (sign === "'" && signAt(passage, at + 1) === "'" && isAttached(passage, at + 1)) return { unit: 'in', next: at + 2 }
  if (sign === '′') return { unit: 'ft', next: at + 1 }
  if (sign === "'" || sign === '’') return readFootMark(passage, at)
  // 3/4-inch, 100-degree: the hyphen only joins, and what follows must be a unit.
  if (sign === '-' && isAttached(passage, at + 1) && wordAt(passage, at + 1) !== '') return whole(passage, readWord(passage, at + 1))
  return undefined
}

/** 10' is feet; in '10' and the 10's it is not. */
function readFootMark(passage: Passage, at: number): UnitRead | undefined {
  const letterNext = isAttached(passage, at + 1) && !['', 'x'].includes(wordAt(passage, at + 1))
  const quoted = ["'", '‘'].includes(signAt(passage, at - 2)) && isAttached(passage, at - 1)
  return letterNext || quoted ? undefined : { unit: 'ft', next: at + 1 }
}

function readWord(passage: Passage, at: number): UnitRead | undefined {
  const word = wordAt(passage, at)
  if (inchWords.has(word)) return readInch(passage, at)
  if (footWords.has(word)) return readFoot(passage, at)
  if (poundWords.has(word)) return readPound(passage, at)
  const unit = plain.get(word)
  if (unit === 'N·m' && letters(passage, at) === 'NM') return undefined
  if (unit) return { unit, next: at + 1 }
  switch (word) {
    case 'm': return letters(passage, at) === 'm' ? { unit: 'm', next: at + 1 } : undefined
    case 'n': case 'newton': case 'newtons': return readNewton(passage, at)
    case 'p': return readSpelledPsi(passage, at)
    case 'oz': case 'ounce': return readOunce(passage, at)
    case 'deg': case 'degs': case 'degree': case 'degrees': return readDegrees(passage, at)
    case 'f': case 'c': return readScale(passage, at)
    case 'bar': case 'bars': return ['stock', 'of'].includes(wordAt(passage, at + 1)) ? undefined : { unit: 'bar', next: at + 1 }
    case 'thousandth': case 'thousandths': return { unit: 'thou', next: behindOfAnInch(passage, at + 1) }
    case 'ga': case 'gauge': case 'gage': return readGauge(passage, at)
    case 'of': case 'an': case 'a': return ofAnInch(passage, at)
    default: return undefined
  }
}

function readInch(passage: Passage, at: number): UnitRead | undefined {
  const pound = behindJoiner(passage, at + 1, true)
  if (poundWords.has(wordAt(passage, pound))) return { unit: 'in-lb', next: withPoint(passage, pound + 1) }
  if (wordAt(passage, pound) === 'oz') return { unit: 'oz-in', next: pound + 1 }
  if (wordAt(passage, pound) === 'hg') return { unit: 'inHg', next: pound + 1 }
  if (wordAt(passage, at) === 'in' && !isAttached(passage, at) && isPreposition(passage, at + 1)) return undefined
  return { unit: 'in', next: wordAt(passage, at) === 'in' ? withPoint(passage, at + 1) : at + 1 }
}

/** "6 in the bag", "5/32 in .050", "in W-3", "in 2024". */
function isPreposition(passage: Passage, at: number): boolean {
  const next = passage.lexemes[at]
  if (!next || next.gap !== 1) return false
  if (isNumber(next) || next.type === 'code' || signAt(passage, at) === '#') return true
  if (next.type !== 'word') return false
  if (placeWords.has(next.text)) return true
  const digits = signAt(passage, at + 1) === '-' ? at + 2 : at + 1
  return numberAt(passage, digits) !== undefined && isAttached(passage, digits) && isAttached(passage, at + 1)
}

function readFoot(passage: Passage, at: number): UnitRead | undefined {
  const pound = behindJoiner(passage, at + 1, true)
  if (poundWords.has(wordAt(passage, pound))) return { unit: 'ft-lb', next: withPoint(passage, pound + 1) }
  return { unit: 'ft', next: wordAt(passage, at) === 'ft' ? withPoint(passage, at + 1) : at + 1 }
}

/** lbf·in, lb-ft, pound feet. Pounds alone are a weight, which is none of ours. */
function readPound(passage: Passage, at: number): UnitRead | undefined {
  const spaced = passage.lexemes[at + 1]?.gap === 1
  const arm = behindJoiner(passage, at + 1, true)
  const word = wordAt(passage, arm)
  if (footWords.has(word)) return { unit: 'ft-lb', next: arm + 1 }
  if (!inchWords.has(word)) return undefined
  return spaced && word === 'in' && isPreposition(passage, arm + 1) ? undefined : { unit: 'in-lb', next: arm + 1 }
}

/** p.s.i. */
function readSpelledPsi(passage: Passage, at: number): UnitRead | undefined {
  const spelled = ['.', 's', '.', 'i'].every((piece, index) => isAttached(passage, at + 1 + index) && passage.lexemes[at + 1 + index]?.text === piece)
  return spelled ? { unit: 'psi', next: signAt(passage, at + 5) === '.' && isAttached(passage, at + 5) ? at + 6 : at + 5 } : undefined
}

function readOunce(passage: Passage, at: number): UnitRead | undefined {
  const arm = behindJoiner(passage, at + 1, true)
  return inchWords.has(wordAt(passage, arm)) ? { unit: 'oz-in', next: arm + 1 } : undefined
}

function readNewton(passage: Passage, at: number): UnitRead | undefined {
  const metre = behindJoiner(passage, at + 1, true)
  const word = wordAt(passage, metre)
  const long = wordAt(passage, at) !== 'n'
  return (long ? /^met(er|re)s?$/.test(word) : word === 'm') ? { unit: 'N·m', next: metre + 1 } : undefined
}

/** Behind ° or "degrees": an F or C makes it a temperature. */
function readDegree(passage: Passage, at: number, unit: UnitName): UnitRead {
  const word = wordAt(passage, at)
  const near = (passage.lexemes[at]?.gap ?? 2) < 2 && !(isAttached(passage, at + 1) && wordAt(passage, at + 1) !== '')
  if (near && (word === 'f' || word === 'fahrenheit')) return { unit: '°F', next: at + 1 }
  if (near && (word === 'c' || word === 'celsius' || word === 'centigrade')) return { unit: '°C', next: at + 1 }
  return { unit, next: at }
}

/** Degrees in a word or as deg., with or without their scale. */
function readDegrees(passage: Passage, at: number): UnitRead {
  const point = signAt(passage, at + 1) === '.' && isAttached(passage, at + 1)
  const scaled = point ? readDegree(passage, at + 2, '°') : undefined
  return scaled && scaled.unit !== '°' ? scaled : readDegree(passage, withPoint(passage, at + 1), '°')
}

const notHeat = new Set(['drill', 'drills', 'bit', 'bits', 'clamp', 'clamps', 'cell', 'cells', 'battery', 'batteries', 'size', 'hole', 'holes', 'channel', 'channels', 'section', 'sections'])

/** 72 F, 20 C: capitals only, and no F drill or C clamp. */
function readScale(passage: Passage, at: number): UnitRead | undefined {
  const letter = letters(passage, at)
  const hyphen = signAt(passage, at + 1) === '-' && isAttached(passage, at + 1) && isAttached(passage, at + 2)
  if ((letter !== 'F' && letter !== 'C') || hyphen || notHeat.has(wordAt(passage, at + 1))) return undefined
  return { unit: letter === 'F' ? '°F' : '°C', next: at + 1 }
}

const notWire = new Set(['sheet', 'steel', 'galvanised', 'galvanized', 'needle', 'panel', 'tin', 'block', 'blocks', 'pin', 'pins', 'mark', 'marks', 'face', 'hole', 'port', 'reading', 'reads'])

function readGauge(passage: Passage, at: number): UnitRead | undefined {
  const next = wordAt(passage, at) === 'ga' ? withPoint(passage, at + 1) : at + 1
  return notWire.has(wordAt(passage, next)) ? undefined : { unit: 'AWG', next }
}

function ofAnInch(passage: Passage, at: number): UnitRead | undefined {
  const next = behindOfAnInch(passage, at)
  return next > at ? { unit: 'in', next } : undefined
}

/** Behind "of an inch" or "an inch", or where it began. */
function behindOfAnInch(passage: Passage, at: number): number {
  const article = wordAt(passage, at) === 'of' ? at + 1 : at
  return ['an', 'a'].includes(wordAt(passage, article)) && wordAt(passage, article + 1) === 'inch' ? article + 2 : at
}

/** Over an optional point and one sign that joins two units; a space alone joins them when `spaced`. */
function behindJoiner(passage: Passage, at: number, spaced: boolean): number {
  let place = at
  while (place < at + 2 && joiners.has(signAt(passage, place)) && isAttached(passage, place)) place += 1
  const gap = passage.lexemes[place]?.gap ?? 2
  return gap === 0 ? (place > at ? place : at) : gap === 1 && spaced && (place === at || signAt(passage, place - 1) === '.') ? place : at + 99
}

/** An abbreviation's point is its own unless the sentence ends there. */
function withPoint(passage: Passage, at: number): number {
  if (signAt(passage, at) !== '.' || !isAttached(passage, at)) return at
  const next = passage.lexemes[at + 1]
  if (!next || next.gap === 2) return at
  const first = passage.text.charAt(next.start)
  return next.gap === 0 ? (/[,;:)-]/.test(first) ? at + 1 : at) : first !== first.toUpperCase() || isNumber(next) ? at + 1 : at
}

/** in2, mm², m/s, ft/min are other units. */
function whole(passage: Passage, read: UnitRead | undefined): UnitRead | undefined {
  if (!read || !isAttached(passage, read.next)) return read
  const next = passage.lexemes[read.next]
  if (next && next.type !== 'sign') return undefined
  const sign = signAt(passage, read.next)
  if (sign === '²' || sign === '³' || sign === '^') return undefined
  return sign === '/' && times.has(wordAt(passage, read.next + 1)) ? undefined : read
}

const letters = (passage: Passage, at: number): string => {
  const lexeme = passage.lexemes[at]
  return lexeme ? passage.text.slice(lexeme.start, lexeme.end) : ''
}
