// Metric screws and threads: M6, M4x0.7, M6x20, M8 x 1.25 x 30. Source of the sizes: ISO 261, first choice and the coarse pitches' range.
import { sized, type Finding } from './make-measurement'
import { placeAfter, wordAt, type Passage } from './passage'
import { screwNouns } from './surroundings'
import type { Ratio } from './units'

const metric = /M(\d{1,2}(?:\.\d)?)(?: ?[x×*] ?(\d{1,3}(?:\.\d{1,2})?))?(?: ?[x×*] ?(\d{1,3}))?(?![\p{L}\p{N}]|[.-]\d)/uy
const sizes = new Set(['1.6', '2', '2.5', '3', '4', '5', '6', '8', '10', '12', '14', '16', '18', '20', '24'])
const nouns = new Set(['cap', 'socket', 'hex', 'tap', 'taps', 'rod', 'eye', 'clearance', 'screw-hole', 'hole', 'holes', 'button'])
const before = new Set(['an', 'threaded', 'tapped', 'an', 'two', 'four', 'six', 'eight'])

/** The metric fastener at the word M; a bare M8 needs a screw beside it, for section codes look the same. */
export function readMetricFastener(passage: Passage, at: number): Finding | undefined {
  const start = passage.lexemes[at]?.start ?? 0
  metric.lastIndex = start
  const match = metric.exec(passage.text)
  const size = match?.[1] ?? ''
  if (!match || !sizes.has(size)) return undefined
  const end = start + match[0].length
  const next = placeAfter(passage, at, end)
  const behind = wordAt(passage, next)
  if (!match[2] && !screwNouns.has(behind) && !nouns.has(behind) && !before.has(wordAt(passage, at - 1))) return undefined
  const { pitch, length } = dimensions(Number(size), match[2], match[3])
  const name = `M${size}${pitch ? `x${pitch}` : ''}${length ? `x${length}` : ''}`
  const measurement = { ...sized(passage, at, next, length ? 'bolt' : 'thread', inInches(size), name), raw: match[0], end }
  if (!length) return { measurements: [measurement], next }
  const { n, d } = inInches(length)
  return { measurements: [{ ...measurement, diameter: measurement.value, length: n / d }], next }
}

/** One number behind the size is a pitch if it could be one, else a length. */
function dimensions(size: number, second: string | undefined, third: string | undefined): { pitch?: string; length?: string } {
  if (!second) return {}
  if (third) return { pitch: second, length: third }
  return Number(second) <= size / 4 + 0.25 ? { pitch: second } : { length: second }
}

/** Millimetres with at most two decimals, as inches: 5/127 to the millimetre. */
const inInches = (millimetres: string): Ratio => ({ n: Math.round(Number(millimetres) * 100) * 5, d: 12_700 })
