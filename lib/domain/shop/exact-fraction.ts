// Shop fractions, exactly: text to a rational number and a length in inches to its fraction of an inch. Units are shop-input.ts.
import Fraction from 'fraction.js'

const FINEST = 64
const unicode: Record<string, string> = { '½': '1/2', '¼': '1/4', '¾': '3/4', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8' }
const written = /^([+-]?)(?:(\d{1,9})[ -])?(\d{1,12})\/(\d{1,9})$|^([+-]?(?:\d{1,15}(?:\.\d{0,15})?|\.\d{1,15}))$/

/** "3/16", "1 1/4", "1-1/4", "½", ".375", "12" as an exact number; null for anything else, and for a division by zero. */
export function parseExact(text: string): Fraction | null {
  const plain = text.trim().replace(/ ?([½¼¾⅛⅜⅝⅞])$/, (_, sign: string) => ` ${unicode[sign] ?? ''}`).trim()
  const match = written.exec(plain)
  if (!match) return null
  if (match[5] !== undefined) return new Fraction(match[5].replace(/\.$/, ''))
  const [, sign, whole = '0', numerator = '0', denominator = '1'] = match
  if (/^0+$/.test(denominator)) return null
  const value = new Fraction(whole).add(new Fraction(`${numerator}/${denominator}`))
  return sign === '-' ? value.neg() : value
}

/** "3/8", "1-1/4", "2" for inches that are a whole number of 64ths; null for any other length. */
export function fractionOfInch(inches: number): string | null {
  const parts = inches * FINEST
  if (!Number.isFinite(parts) || Math.abs(parts - Math.round(parts)) > 1e-7) return null
  return new Fraction(Math.round(parts), FINEST).toFraction(true).replace(' ', '-')
}

/** A fraction of our own tables as a number. Throws on text that is no number: the tables are part of the program. */
export function inchesOf(text: string): number {
  const value = parseExact(text)
  if (!value) throw new Error(`not a fraction: ${text}`)
  return value.valueOf()
}
