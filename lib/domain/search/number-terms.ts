// Terms that stand for the values of a text's measurements, whatever the unit: 3/16, 0.1875 and 4.76 mm share one, #40 and 0.098 too.
// For entries and for questions; how much an equal value counts is number-routes.ts. Numbers as written are designations.ts.
import { findMeasurements } from '../measurements/find-measurements'
import { measureTokens } from '../measurements/measure-tokens'
import type { Measurement } from '../measurements/measurement'
import { singleCells, spannedCells } from './range-cells'

/** Marks terms of values; no text can hold it, so no word can be mistaken for one. */
export const valueMark = '≡'

export interface PlacedValue {
  terms: readonly string[]
  /** UTF-16, end exclusive. */
  start: number
  end: number
}

/** A number in digits, a fraction's sign, or a word with which numbers are said (half, thirty-second, two inches, number thirty, F drill). */
const mayMeasure = /[\d½¼¾⅛⅜⅝⅞⅓⅔]|\b(?:[Hh]alf|[Qq]uarter|eighth|sixteenth|second|fourth|inch|thou|degree|feet|pounds|[Nn]umber|[Ll]etter|[B-HJ-Z] (?:drill|bit|reamer))/
const sentenceEnd = /[.!?]\s+(?=[A-Z])|\n/g

/** The measurements of a text. Reading a text for them costs half of what analysing its words does, so only sentences that may hold one are read. Linear; never throws. */
export function measureSentences(text: string): Measurement[] {
  const found: Measurement[] = []
  let start = 0
  const read = (end: number) => {
    const sentence = text.slice(start, end)
    if (!mayMeasure.test(sentence)) return
    for (const one of findMeasurements(sentence)) found.push({ ...one, start: one.start + start, end: one.end + start })
  }
  if (!mayMeasure.test(text)) return found
  for (const match of text.matchAll(sentenceEnd)) {
    read(match.index)
    start = match.index + match[0].length
  }
  read(text.length)
  return found
}

/** What an entry's text is found by, in its order. */
export function findValues(text: string): PlacedValue[] {
  return measureSentences(text).map((one) => ({ terms: [...equalTerms(one), ...spannedCells(one), ...singleCells(one)].map(mark), start: one.start, end: one.end }))
}

/** What says the same holds one of them; of a range, of both its ends. A rivet or bolt is no length, though it has a diameter. */
export const equalTerms = (measurement: Measurement): string[] =>
  (measurement.kind === 'rivet' || measurement.kind === 'bolt' ? measureTokens(measurement).filter((token) => token.startsWith(measurement.kind)) : measureTokens(measurement))
export const mark = (token: string): string => valueMark + token
