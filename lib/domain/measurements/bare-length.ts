// Whether a number without a unit is inches: a fraction of an inch or a decimal, judged by the words round it.
import { hasWordBefore, isAttached, signAt, wordAt, type Passage } from './passage'
import type { NumberRead } from './read-number'
import { bareValueWords, dateWords, determiners, fractionLabels, otherQuantities, partNouns, screwNouns } from './surroundings'

/** `from` and `next` bound what is judged as a whole: the number itself, or the range it ends. */
export function isBareLength(passage: Passage, number: NumberRead, from = number.from, next = number.next): boolean {
  if (isOther(passage, from, next)) return false
  if (number.form === 'whole') return isBesideDimension(passage, number, from, next)
  if (number.form === 'decimal') return isBareDecimal(passage, number, from, next)
  if (number.form === 'fraction' || number.form === 'mixed') return isBareFraction(passage, number, from, next)
  return number.form === 'words' && isSpokenFraction(passage, number, next)
}

/** Another unit, a percentage, money, "3/4 of the rivets". */
function isOther(passage: Passage, from: number, next: number): boolean {
  const after = wordBehind(passage, next)
  // 13/64s are drills, 5 A are amperes.
  // 5/16 min behind an edge or a hole is a least, and no minute.
  const isLeast = after === 'min' && hasWordBefore(passage, from, 4, partNouns)
  if (otherQuantities.has(after) && !isLeast && !(after === 's' && isAttached(passage, next))) return true
  const lexeme = passage.lexemes[next]
  if (lexeme?.type === 'word' && passage.text.slice(lexeme.start, lexeme.end) === 'A') return true
  if ('%$€£Ω°'.includes(signAt(passage, next) || ' ')) return true
  if (signAt(passage, next) === ':' && isAttached(passage, next) && isAttached(passage, next + 1)) return true
  if ('$€£§'.includes(signAt(passage, from - 1) || ' ')) return true
  return after === 'of' && determiners.has(wordAt(passage, next + 1))
}

/** Nobody writes larger lengths in bare decimals, but regulations have such numbers. */
const mostBare = 20
const binary = new Set([2, 4, 8, 16, 32, 64, 128])

function isBareFraction(passage: Passage, number: NumberRead, from: number, next: number): boolean {
  const [n = 0, d = 1] = (number.text.split(' ').at(-1) ?? '').split('/').map(Number)
  const part = isBesidePart(passage, from, next)
  if (!binary.has(d) || n >= d || n === 0 || (n % 2 === 0 && !part)) return false
  // 8/32 screws are 8-32 screws.
  if (n % 2 === 0 && d === 32 && (screwNouns.has(wordBehind(passage, next)) || screwNouns.has(wordAt(passage, next + 1)))) return false
  if (isHalfAndHalf(passage, number, from, next)) return false
  const before = wordBefore(passage, from)
  if (fractionLabels.has(before) || (before === 'of' && fractionLabels.has(wordBefore(passage, from - 1)))) return false
  const after = wordBehind(passage, next)
  if (d <= 4 && determiners.has(after)) return false
  // On 3/8 we closed the tank; on 3/8 tube there's a nick.
  return !(number.form === 'fraction' && dateWords.has(before) && n <= 12 && d <= 31 && !partNouns.has(after))
}

/** 1/2 and 1/2 is a mix. */
const isHalfAndHalf = (passage: Passage, { text }: NumberRead, from: number, next: number): boolean =>
  text === '1/2' && ((wordAt(passage, next) === 'and' && passage.lexemes[next + 1]?.text === text) || (wordAt(passage, from - 1) === 'and' && passage.lexemes[from - 2]?.text === text))

function isBareDecimal(passage: Passage, number: NumberRead, from: number, next: number): boolean {
  const value = number.n / number.d
  const decimals = number.text.length - number.text.indexOf('.') - 1
  if (value === 0 || value >= mostBare || hasWordBefore(passage, from, 3, bareValueWords)) return false
  if (value >= 1) return decimals === 3 || decimals === 4
  return decimals >= 2 || isBesidePart(passage, from, next)
}

/** Three eighths are inches; three quarters and halves may be of anything. */
function isSpokenFraction(passage: Passage, number: NumberRead, next: number): boolean {
  const denominator = number.text.split('/')[1]
  return denominator !== undefined && Number(denominator) >= 8 && number.next - number.from > 1 && wordBehind(passage, next) !== 'of'
}

const dimensionWords = new Set(['tall', 'wide', 'deep', 'long', 'high', 'across', 'apart'])
/** Behind a dimension word these end what was measured; a noun would be what is counted: 12 long bolts. */
const afterDimension = new Set(['and', 'by', 'or', 'at', 'in', 'on', 'with', 'to', 'for', 'so', 'but', 'from', 'is', 'x', 'as', 'when', 'if', 'not', 'inside', 'outside', 'overall', 'the'])
const stacked = new Set(['stacked', 'stack', 'rows', 'row', 'piled', 'parked', 'layers'])
const leastBare = 4

/** 36 tall: nobody stands three deep in inches, so small counts are left alone. */
function isBesideDimension(passage: Passage, { n, text }: NumberRead, from: number, next: number): boolean {
  if (n < leastBare || text.startsWith('0') || !dimensionWords.has(wordAt(passage, next)) || hasWordBefore(passage, from, 3, stacked)) return false
  const behind = passage.lexemes[next + 1]
  return !behind || behind.gap === 2 || behind.type === 'sign' || afterDimension.has(behind.text)
}

function isBesidePart(passage: Passage, from: number, next: number): boolean {
  return partNouns.has(wordBehind(passage, next)) || partNouns.has(wordAt(passage, next + 1)) || hasWordBefore(passage, from, 3, partNouns)
}

/** The word behind, also over a hyphen: 1/4-turn. */
function wordBehind(passage: Passage, at: number): string {
  return wordAt(passage, signAt(passage, at) === '-' && isAttached(passage, at + 1) ? at + 1 : at)
}

const wordBefore = (passage: Passage, at: number): string => wordAt(passage, at - 1) || (signAt(passage, at - 1) === '.' ? wordAt(passage, at - 2) : '')
