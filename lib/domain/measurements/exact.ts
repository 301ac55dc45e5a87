// Exact rational numbers, kept by fraction.js. The only file that knows how.
import Fraction from 'fraction.js'

/** A rational number in lowest terms: sign s, numerator n and denominator d above zero. */
export type Exact = Fraction

/** n / d of two whole numbers, d not zero. */
export const exact = (n: number | bigint, d: number | bigint = 1): Exact => new Fraction(n, d)

/** The value of decimal text such as "0.45359237" or ".032". */
export const exactDecimal = (text: string): Exact => new Fraction(text.startsWith('.') ? `0${text}` : text)

export const plus = (a: Exact, b: Exact): Exact => a.add(b)
export const minus = (a: Exact, b: Exact): Exact => a.sub(b)
export const times = (a: Exact, b: Exact): Exact => a.mul(b)

/** a / b; throws a RangeError when b is zero. */
export function over(a: Exact, b: Exact): Exact {
  if (b.n === 0n) throw new RangeError('division by zero')
  return a.div(b)
}

/** Below zero, zero or above zero as a is below, equal to or above b. */
export const compare = (a: Exact, b: Exact): number => a.compare(b)

const safe = BigInt(Number.MAX_SAFE_INTEGER)

/**
 * The nearest double: two whole numbers a double holds exactly are divided with one rounding, larger ones are brought down first.
 * (valueOf rounds numerator and denominator before it divides.)
 */
export function toNumber({ s, n, d }: Exact): number {
  if (n <= safe && d <= safe) return Number(s) * (Number(n) / Number(d))
  const shift = 66 - (n.toString(2).length - d.toString(2).length)
  const top = shift > 0 ? n << BigInt(shift) : n
  const bottom = shift > 0 ? d : d << BigInt(-shift)
  // The last bit remembers that something was left over, so that the rounding to 53 bits is right.
  const quotient = (top / bottom) | (top % bottom === 0n ? 0n : 1n)
  return Number(s) * Number(quotient) * 2 ** -shift
}
