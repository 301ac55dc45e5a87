// Unified threads by size and threads to the inch: 10-32, 1/4-28, #8-32. Source of the pairs and diameters: ASME B1.1 (coarse, fine and extra-fine
// series); number n is 0.060 + 0.013 n in. Metric threads are read-metric-fastener.ts.
import { sized, type Finding } from './make-measurement'
import { isAttached, numberAt, signAt, wordAt, type Passage } from './passage'
import { readUnit } from './read-unit'
import { labelBefore } from './stands-free'
import { labels, otherQuantities } from './surroundings'

const numbered: Record<number, readonly number[]> = {
  0: [80], 2: [56, 64], 3: [48, 56], 4: [40, 48], 5: [40, 44], 6: [32, 40], 8: [32, 36], 10: [24, 32], 12: [24, 28],
}
const fractional: Record<string, readonly number[]> = {
  '1/4': [20, 28, 32], '5/16': [18, 24, 32], '3/8': [16, 24, 32], '7/16': [14, 20, 28], '1/2': [13, 20, 28], '9/16': [12, 18, 24], '5/8': [11, 18, 24],
  '3/4': [10, 16, 20], '7/8': [9, 14, 20],
}

/** The thread whose size stands at a place; `from` is earlier when a # stands in front. */
export function readThread(passage: Passage, at: number, from = at): Finding | undefined {
  const size = numberAt(passage, at)
  const pitch = numberAt(passage, at + 2)
  if (!size || pitch?.type !== 'whole' || !['-', '–', '‑'].includes(signAt(passage, at + 1)) || !isAttached(passage, at + 1) || !isAttached(passage, at + 2)) return undefined
  const pitches = size.type === 'fraction' ? fractional[size.text] : size.type === 'whole' && String(size.n) === size.text ? numbered[size.n] : undefined
  if (!pitches?.includes(pitch.n) || !endsThere(passage, at + 3) || labels.has(labelBefore(passage, at))) return undefined
  const diameter = size.type === 'fraction' ? size : { n: 60 + 13 * size.n, d: 1000 }
  return { measurements: [sized(passage, from, at + 3, 'thread', diameter, `${size.text}-${pitch.text}`)], next: at + 3 }
}

/** 10-32 hours, 8-32 in-lb and 10-24-2024 are no threads. */
function endsThere(passage: Passage, at: number): boolean {
  if (isAttached(passage, at) && (passage.lexemes[at]?.type !== 'sign' || (signAt(passage, at) === '-' && isAttached(passage, at + 1) && numberAt(passage, at + 1)))) return false
  return !otherQuantities.has(wordAt(passage, at)) && readUnit(passage, at) === undefined && signAt(passage, at) !== '%'
}
