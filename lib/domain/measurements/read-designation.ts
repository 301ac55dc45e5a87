// AN, MS and NAS rivets and AN bolts by their numbers: what diameter, length and grip they say. Washers, nuts, screws and grommets say none here.
import { sized, type Finding } from './make-measurement'
import { placeAfter, type Passage } from './passage'
import type { Ratio } from './units'

// Rivets, NAVEDTRA 14018 ch. 13 numbering: diameter in 32nds, length in 16ths of an inch. The pieces may stand apart: AN 470 AD 4-6.
const rivetNumber = /(?:AN[ -]?(?:426|430|442|455|456|470)|MS[ -]?(?:20426|20430|20442|20455|20456|20470)|NAS[ -]?(?:1097))[ -]?(AD|DD|[A-E]|KE|M)?[ -]?(\d{1,2})(?:[ ]?-(\d{1,2})(\.5|-5)?)?(?=s?(?![\p{L}\p{N}]))/iuy
/** The alloy and dashes alone, as said at the bench: AD4-6. */
const shortRivet = /(AD|DD)(\d{1,2})-(\d{1,2})(\.5)?(?![\p{L}\p{N}]|[.-]\d)/iuy
// Bolts: AN, sixteenths, C or DD for the metal, H for a drilled head, the length dash, A for a shank without a hole.
const boltNumber = /AN ?(\d{1,2})(?:-?(?:C|DD))?(?:-?H)?(?:(?<=[CDH])-?|-)(\d{1,2})A?(?=s?(?![\p{L}\p{N}]|[.-]\d))/iuy
const boltAlone = /AN(\d{1,2})(?:C|DD)?H?(?=s?(?![\p{L}\p{N}]|-[\p{L}\p{N}]))/iuy

/** The designation that begins with the word at a place; undefined if it is none of these. */
export function readDesignation(passage: Passage, at: number): Finding | undefined {
  const start = passage.lexemes[at]?.start ?? 0
  return readRivet(passage, at, start) ?? readBolt(passage, at, start)
}

function readRivet(passage: Passage, at: number, start: number): Finding | undefined {
  const match = matchAt(rivetNumber, passage.text, start) ?? matchAt(shortRivet, passage.text, start)
  if (!match) return undefined
  const thirtySeconds = Number(match[2])
  if (thirtySeconds < 1 || thirtySeconds > 16) return undefined
  const length = (Number(match[3] ?? 0) + (match[4] ? 0.5 : 0)) / 16
  return finding(passage, at, match[0], 'rivet', { n: thirtySeconds, d: 32 }, length > 0 ? { length } : {})
}

/** AN3 to AN20 where the series has a size. */
const boltSizes = new Set([3, 4, 5, 6, 7, 8, 9, 10, 12, 14, 16, 18, 20])
/** Length over its dash eighths, and thread beyond the grip, in 64ths; and the first dash the sources list. AN3 to AN6 only: no other is listed. */
const boltLengths: Record<number, { over: number; thread: number; first: number }> = {
  3: { over: 2, thread: 26, first: 4 }, 4: { over: 2, thread: 30, first: 4 }, 5: { over: 6, thread: 34, first: 5 }, 6: { over: 5, thread: 41, first: 5 },
}
const lastDash = 27

function readBolt(passage: Passage, at: number, start: number): Finding | undefined {
  const match = matchAt(boltNumber, passage.text, start) ?? matchAt(boltAlone, passage.text, start)
  const size = Number(match?.[1])
  // "An 8-32" is a thread behind an article.
  if (!match || !boltSizes.has(size) || (match[0].charAt(2) === ' ' && !match[0].startsWith('AN'))) return undefined
  return finding(passage, at, match[0], 'bolt', { n: size, d: 16 }, boltDimensions(size, match[2]))
}

/**
 * Length and grip of a dash number in inches: tens are whole inches, ones are eighths, as hardware suppliers' technical notes print AN3 to AN6
 * (the standard, NASM3-20, was not seen). Empty beyond what they list.
 */
function boltDimensions(size: number, dash: string | undefined): { length?: number; grip?: number } {
  const rule = boltLengths[size]
  const number = Number(dash)
  if (!rule || dash === undefined || number < rule.first || number > lastDash || number % 10 > 7) return {}
  const sixtyFourths = 8 * (8 * Math.floor(number / 10) + (number % 10)) + rule.over
  return { length: sixtyFourths / 64, grip: (sixtyFourths - rule.thread) / 64 }
}

function finding(passage: Passage, at: number, raw: string, kind: 'rivet' | 'bolt', diameter: Ratio, dimensions: { length?: number; grip?: number }): Finding {
  const start = passage.lexemes[at]?.start ?? 0
  const next = placeAfter(passage, at, start + raw.length)
  const measurement = sized(passage, at, next, kind, diameter, raw.toUpperCase().replaceAll(' ', ''))
  // A slash may have bound the last digit to another number: AN470AD4-4/5.
  return { measurements: [{ ...measurement, raw, end: start + raw.length, diameter: measurement.value, ...dimensions }], next }
}

function matchAt(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
  pattern.lastIndex = at
  return pattern.exec(text)
}
