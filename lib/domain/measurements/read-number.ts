// One number as the trade writes it: 36, .032, 3/16, 2 1/8, 2-1/8, 3½, twenty-one, three eighths. Units and ranges are not read here.
import { isAttached, signAt, wordAt, type Passage } from './passage'
import { countedNouns } from './surroundings'

export interface NumberRead {
  /** Its value, n / d: whole numbers far below what a double holds exactly. */
  n: number
  d: number
  /** words: said in words; mixed: a whole and a fraction. */
  form: 'whole' | 'decimal' | 'fraction' | 'mixed' | 'words'
  /** 3/16 or 2 1/8; the digits of the others. */
  text: string
  /** Place of the first and behind the last lexeme. */
  from: number
  next: number
}

const mostWhole = 200

/** The number that begins at a lexeme; undefined if none does, or if its denominator is zero. */
export function readNumber(passage: Passage, at: number): NumberRead | undefined {
  const first = passage.lexemes[at]
  if (!first) return undefined
  const { type, text, n, d } = first
  if (type === 'word') return spoken.has(text) ? readNumberWords(passage, at) : undefined
  if (type !== 'whole' && type !== 'decimal' && type !== 'fraction') return undefined
  if (type === 'whole') {
    const mixed = readMixed(passage, at, n)
    if (mixed) return mixed
    const part = n > 0 && n <= mostWhole ? partBehindAnd(passage, at + 1) : undefined
    if (part) return { ...inWords(n * part.parts + part.count, part.parts, at, part.next), form: 'words' }
  }
  return d === 0 ? undefined : { n, d, form: type, text, from: at, next: type === 'fraction' ? behindEnding(passage, at + 1) : at + 1 }
}

const endings = new Set(['th', 'ths', 'nd', 'nds', 'rd', 'rds'])

/** 1/16th, 3/32nds. */
const behindEnding = (passage: Passage, at: number): number => (isAttached(passage, at) && endings.has(wordAt(passage, at)) ? at + 1 : at)

function readMixed(passage: Passage, at: number, whole: number): NumberRead | undefined {
  const hyphen = signAt(passage, at + 1) === '-' && passage.lexemes[at + 1]?.gap === 0
  const place = hyphen ? at + 2 : at + 1
  const fraction = passage.lexemes[place]
  if (fraction?.type !== 'fraction' || fraction.d === 0 || fraction.n >= fraction.d) return undefined
  if (whole > mostWhole || fraction.gap === 2 || (hyphen && fraction.gap !== 0)) return undefined
  // "3 1/8 rivets" are three rivets.
  if (!hyphen && fraction.gap === 1 && countedNouns.has(wordAt(passage, place + 1))) return undefined
  return { n: whole * fraction.d + fraction.n, d: fraction.d, form: 'mixed', text: `${whole} ${fraction.text}`, from: at, next: behindEnding(passage, place + 1) }
}

const ones = 'zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(' ')
const tens = 'twenty thirty forty fifty sixty seventy eighty ninety'.split(' ')
const wholeWords = new Map([...ones.map((word, value) => [word, value] as const), ...tens.map((word, index) => [word, 20 + 10 * index] as const)])
const partWords = new Map<string, number>([
  ['half', 2], ['halves', 2], ['quarter', 4], ['quarters', 4], ['eighth', 8], ['eighths', 8], ['sixteenth', 16], ['sixteenths', 16],
])
const spoken = new Set([...wholeWords.keys(), ...partWords.keys()])
const compoundParts = new Map<string, number>([['thirty second', 32], ['thirty seconds', 32], ['sixty fourth', 64], ['sixty fourths', 64]])

/** A whole number in words, 1 to 99: the value and the place behind it. */
export function readWholeWords(passage: Passage, at: number): { value: number; next: number } | undefined {
  const value = wholeWords.get(wordAt(passage, at))
  if (value === undefined || value === 0) return undefined
  if (value < 20 || value % 10 !== 0) return { value, next: at + 1 }
  const place = signAt(passage, at + 1) === '-' ? at + 2 : at + 1
  const unit = wholeWords.get(wordAt(passage, place))
  return unit !== undefined && unit > 0 && unit < 10 ? { value: value + unit, next: place + 1 } : { value, next: at + 1 }
}

function readNumberWords(passage: Passage, at: number): NumberRead | undefined {
  const alone = partAt(passage, at)
  if (alone) return inWords(1, alone.parts, at, alone.next)
  const whole = readWholeWords(passage, at)
  if (!whole) return undefined
  const part = partAt(passage, signAt(passage, whole.next) === '-' ? whole.next + 1 : whole.next)
  if (part) return whole.value < part.parts ? inWords(whole.value, part.parts, at, part.next) : undefined
  const more = partBehindAnd(passage, whole.next)
  return more ? inWords(whole.value * more.parts + more.count, more.parts, at, more.next) : inWords(whole.value, 1, at, whole.next)
}

/** And a half, and three eighths. */
function partBehindAnd(passage: Passage, at: number): { count: number; parts: number; next: number } | undefined {
  if (wordAt(passage, at) !== 'and') return undefined
  const counted = wordAt(passage, at + 1) === 'a' ? { value: 1, next: at + 2 } : readWholeWords(passage, at + 1)
  const part = counted && partAt(passage, signAt(passage, counted.next) === '-' ? counted.next + 1 : counted.next)
  return part && counted.value < part.parts ? { count: counted.value, ...part } : undefined
}

function partAt(passage: Passage, at: number): { parts: number; next: number } | undefined {
  const word = wordAt(passage, at)
  const parts = partWords.get(word)
  if (parts !== undefined) return { parts, next: at + 1 }
  if (word !== 'thirty' && word !== 'sixty') return undefined
  const second = signAt(passage, at + 1) === '-' ? at + 2 : at + 1
  const compound = compoundParts.get(`${word} ${wordAt(passage, second)}`)
  return compound === undefined ? undefined : { parts: compound, next: second + 1 }
}

function inWords(n: number, d: number, from: number, next: number): NumberRead {
  const whole = Math.floor(n / d)
  const text = d === 1 ? String(n) : whole > 0 ? `${whole} ${n % d}/${d}` : `${n}/${d}`
  return { n, d, form: 'words', text, from, next }
}
