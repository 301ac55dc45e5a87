// A text cut into words, numbers and single signs, once, from left to right. What they mean together is for the readers beside this file.

/**
 * word: letters; whole, decimal, fraction: a number n / d as written; sign: one character;
 * code: digits that are no quantity (12.03.2024, 3/4/24, too many of them).
 */
export type LexemeType = 'word' | 'whole' | 'decimal' | 'fraction' | 'sign' | 'code'

/** One shape for all, so that a long text is read fast. */
export interface Lexeme {
  type: LexemeType
  start: number
  end: number
  /** White before it: none, space, or a line's end. */
  gap: Gap
  /** A word in lower case, the sign, or the number without thousands commas. */
  text: string
  n: number
  /** 1 of a whole, a power of ten of a decimal. */
  d: number
}
export type Gap = 0 | 1 | 2

const glyphs = new Map<number, readonly [number, number]>(Object.entries({
  '½': [1, 2], '¼': [1, 4], '¾': [3, 4], '⅛': [1, 8], '⅜': [3, 8], '⅝': [5, 8], '⅞': [7, 8], '⅓': [1, 3], '⅔': [2, 3],
} satisfies Record<string, [number, number]>).map(([glyph, fraction]) => [glyph.charCodeAt(0), fraction]))
const point = 46
const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹'
const lowered = '₀₁₂₃₄₅₆₇₈₉'
const slashes = '/⁄∕'
/** Longer runs are part numbers or noise, and would not be exact in a double. */
const mostDigits = 7

/** Linear in the length of the text; never throws. */
export function lexemesOf(text: string): Lexeme[] {
  const lexemes: Lexeme[] = []
  let gap: Gap = 0
  let end = 0
  for (let at = 0; at < text.length; at = Math.max(end, at + 1)) {
    const code = text.charCodeAt(at)
    if (isWhite(code)) {
      gap = widened(gap, code)
      continue
    }
    const lexeme = cutAt(text, at, code, gap, end === at)
    lexemes.push(lexeme)
    gap = 0
    end = lexeme.end
  }
  return lexemes
}

function cutAt(text: string, at: number, code: number, gap: Gap, attached: boolean): Lexeme {
  if (isDigit(code)) return cutNumber(text, at, gap)
  // A point that ends a word or a number begins no decimal.
  if (code === point && isDigit(text.charCodeAt(at + 1)) && !(attached && isWordPart(text.charCodeAt(at - 1)))) return cutNumber(text, at, gap)
  if (code > 127) {
    const glyph = glyphs.get(code)
    if (glyph) return lexemeOf('fraction', at, at + 1, gap, `${glyph[0]}/${glyph[1]}`, glyph[0], glyph[1])
    const small = raised.indexOf(text.charAt(at)) >= 0 ? cutRaised(text, at, gap) : undefined
    if (small) return small
  }
  return isLetter(code) ? cutWord(text, at, gap) : lexemeOf('sign', at, at + 1, gap, text.charAt(at))
}

const widened = (gap: Gap, code: number): Gap => (code === 10 || code === 13 || gap === 2 ? 2 : 1)
const lexemeOf = (type: LexemeType, start: number, end: number, gap: Gap, text = '', n = 0, d = 1): Lexeme => ({ type, start, end, gap, text, n, d })

function cutWord(text: string, start: number, gap: Gap): Lexeme {
  let end = start + 1
  while (end < text.length && isLetter(text.charCodeAt(end))) end += 1
  return lexemeOf('word', start, end, gap, text.slice(start, end).toLowerCase())
}

function cutNumber(text: string, start: number, gap: Gap): Lexeme {
  let end = digitsEnd(text, start)
  let digits = text.slice(start, end)
  while (end - start <= mostDigits && digits.length > 0 && startsThousands(text, end)) {
    digits += text.slice(end + 1, end + 4)
    end += 4
  }
  const slash = text.charAt(end)
  if (digits !== '' && slash !== '' && slashes.includes(slash) && isDigit(text.charCodeAt(end + 1))) return cutFraction(text, start, digits, end, gap)
  if (slash === '.' && isDigit(text.charCodeAt(end + 1))) return cutDecimal(text, start, digits, end, gap)
  if (slash === ',' && startsMetricDecimal(text, end)) return cutDecimal(text, start, digits, end, gap)
  return digits.length > mostDigits ? lexemeOf('code', start, end, gap) : lexemeOf('whole', start, end, gap, digits, Number(digits))
}

function cutDecimal(text: string, start: number, digits: string, dot: number, gap: Gap): Lexeme {
  const end = digitsEnd(text, dot + 1)
  const decimals = text.slice(dot + 1, end)
  const more = text.charAt(end)
  const goesOn = (more === '.' || slashes.includes(more)) && more !== '' && isDigit(text.charCodeAt(end + 1))
  if (digits.length + decimals.length > mostDigits || (goesOn && more === '.')) return lexemeOf('code', start, goesOn ? runEnd(text, end) : end, gap)
  return lexemeOf('decimal', start, end, gap, `${digits}.${decimals}`, Number(digits + decimals), 10 ** decimals.length)
}

function cutFraction(text: string, start: number, digits: string, slash: number, gap: Gap): Lexeme {
  const end = digitsEnd(text, slash + 1)
  const below = text.slice(slash + 1, end)
  const more = text.charAt(end)
  const goesOn = more !== '' && (slashes + '.').includes(more) && isDigit(text.charCodeAt(end + 1))
  if (goesOn || digits.length > 4 || below.length > 4) return lexemeOf('code', start, goesOn ? runEnd(text, end) : end, gap)
  return lexemeOf('fraction', start, end, gap, `${digits}/${below}`, Number(digits), Number(below))
}

/** ³⁄₁₆, and ¹/₈. */
function cutRaised(text: string, start: number, gap: Gap): Lexeme | undefined {
  const above = digitsOf(text, start, raised)
  const slash = text.charAt(start + above.length)
  if (slash === '' || !slashes.includes(slash)) return undefined
  const below = digitsOf(text, start + above.length + 1, lowered)
  if (below === '') return undefined
  return lexemeOf('fraction', start, start + above.length + 1 + below.length, gap, `${above}/${below}`, Number(above), Number(below))
}

function digitsOf(text: string, from: number, alphabet: string): string {
  let digits = ''
  for (let at = from; at < text.length && digits.length < 4; at += 1) {
    const digit = alphabet.indexOf(text.charAt(at))
    if (digit < 0) break
    digits += digit
  }
  return digits
}

function digitsEnd(text: string, from: number): number {
  let end = from
  while (isDigit(text.charCodeAt(end))) end += 1
  return end
}

/** To the end of digits strung together with points and slashes. */
function runEnd(text: string, from: number): number {
  let end = from
  while (isDigit(text.charCodeAt(end)) || ((text.charAt(end) === '.' || text.charAt(end) === '/') && isDigit(text.charCodeAt(end + 1)))) end += 1
  return end
}

const startsThousands = (text: string, comma: number): boolean =>
  text.charAt(comma) === ',' && digitsEnd(text, comma + 1) === comma + 4

/** 2,5 mm: a decimal comma is believed only in front of a metric unit. */
function startsMetricDecimal(text: string, comma: number): boolean {
  const end = digitsEnd(text, comma + 1)
  if (end === comma + 1 || end > comma + 3) return false
  const unit = text.slice(end, end + 4).trimStart().toLowerCase()
  return unit.startsWith('mm') || unit.startsWith('cm') || unit.startsWith('nm') || unit.startsWith('bar')
}

const isDigit = (code: number): boolean => code >= 48 && code <= 57
const isWhite = (code: number): boolean => code === 32 || (code >= 9 && code <= 13) || code === 0xa0 || code === 0x202f || (code >= 0x2000 && code <= 0x200b)
/** An x stands between two sizes. */
const isWordPart = (code: number): boolean => isDigit(code) || (isLetter(code) && code !== 120 && code !== 88)

/** º is taken for °, Ø and ø for the sign of a diameter. */
const noLetters = new Set('ºØø')
/** By code unit: 0 not asked yet, 1 no, 2 a letter. Asking a regular expression of every character would be most of the work. */
const known = new Uint8Array(0x10000)

function isLetter(code: number): boolean {
  if (code < 128) return (code >= 97 && code <= 122) || (code >= 65 && code <= 90)
  const answer = known[code]
  if (answer) return answer === 2
  const sign = String.fromCharCode(code)
  const letter = !noLetters.has(sign) && /\p{L}|\p{M}/u.test(sign)
  known[code] = letter ? 2 : 1
  return letter
}
