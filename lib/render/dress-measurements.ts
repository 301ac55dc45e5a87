// Works on the sanitised and dressed HTML tree: puts dimension arrows around the measurements of a text and says them in the other
// system. It makes only the elements below, from numbers of our own; the text between them stays as its author typed it. Both systems
// are in the HTML, so that it can be kept for every reader: `data-units` on the page decides (components/prose/measures.css).
//
// A page of arrows would be unreadable on a phone, so each thing is said where it is needed and once:
// - arrows at a value's first mention in a block, never in a table, which is a drawing of numbers already;
// - "also …" at its first mention in the text: a reader's chosen system leads at every mention, so this is for the other one;
// - nothing that the author wrote beside it: #30 (0.1285) needs no decimal, 3/16 in (4.76 mm) no millimetres;
// - a drill's decimal always, since a drill number never stands without it.
import type { Element, ElementContent, Root, Text } from 'hast'
import type { FirstSystem } from '@/lib/domain/measurements/format-measurement'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import type { Measurement } from '@/lib/domain/measurements/measurement'
import { proseMeasure, type ProseMeasure } from '@/lib/domain/measurements/prose-measure'
import { sameMeasure } from '@/lib/domain/measurements/same-measure'
import { readBlocks, type Block, type Run } from './text-blocks'

/** A text that holds more is a list of numbers, and its HTML would grow by twenty times. */
const mostDressed = 200
/** Arrows keep to the line of a short size; a longer one has to break on a phone. */
const longestWhole = 20

/** Adds the elements in place. */
export function dressMeasurements(tree: Root): void {
  const told = new Set<string>()
  let left = mostDressed
  for (const block of readBlocks(tree)) {
    const found = findMeasurements(block.text)
    const shown = new Set<string>()
    let at = 0
    for (const run of block.runs) {
      const end = run.start + run.node.value.length
      const dressings: Dressing[] = []
      // What began in an earlier node reaches over its mark, as **3**/16 does, and stays as it is.
      while ((found[at]?.start ?? Infinity) < run.start) at += 1
      for (; left > 0 && (found[at]?.end ?? Infinity) <= end; at += 1) {
        const dressing = dressingOf(block, found, at, { shown, told })
        if (!dressing) continue
        dressings.push(dressing)
        left -= 1
      }
      dressRun(run, dressings)
    }
  }
}

interface Dressing { start: number; end: number; around(written: string): ElementContent[] }
/** Values that already have arrows in this block; those whose other system was said in this text. */
interface Said { shown: Set<string>; told: Set<string> }

function dressingOf({ text, isTable }: Block, found: readonly Measurement[], at: number, { shown, told }: Said): Dressing | null {
  const measurement = found[at]
  const measure = measurement && proseMeasure(measurement)
  if (!measure) return null
  const { start, end, kind } = measurement
  const key = keyOf(measurement)
  const before = repeat(text, found[at - 1], measurement, found[at - 1])
  const after = repeat(text, measurement, found[at + 1], found[at + 1])
  const isGlued = /[\p{L}\p{N}\-–—/×%&_]/u.test(text.charAt(end))
  const look: Look = {
    hasArrows: !isTable && !before && !shown.has(key),
    hasLead: !before && (after ?? measure.writtenIn) === measure.writtenIn,
    hasMore: !before && !after && (!isGlued || kind === 'drill'),
    hasAlso: !after && (before ?? measure.writtenIn) === measure.writtenIn && !isGlued && !isTable && !told.has(key),
  }
  shown.add(key)
  if (look.hasAlso || (before && before !== measure.writtenIn)) told.add(key)
  return { start, end, around: (written) => dressed(written, measure, look) }
}

const keyOf = ({ kind, si }: Measurement): string => [kind === 'drill' ? 'length' : kind, si.value.toPrecision(6), si.max?.toPrecision(6) ?? ''].join(' ')

/**
 * Of two that say the same size side by side, "#30 (0.1285)" or "3/16 in = 4.76 mm", the system that `other` is written in; undefined
 * when they do not. A conversion that is off is no repeat, so that ours stands beside it.
 */
function repeat(text: string, first: Measurement | undefined, second: Measurement | undefined, other: Measurement | undefined): FirstSystem | undefined {
  if (!first || !second || !other || !proseMeasure(first) || !proseMeasure(second)) return undefined
  const isBeside = /^[\s·(=,≈~/[]{1,4}$/.test(text.slice(first.end, second.start))
  return isBeside && sameMeasure(first, second) ? proseMeasure(other)?.writtenIn : undefined
}

interface Look { hasArrows: boolean; hasLead: boolean; hasMore: boolean; hasAlso: boolean }

function dressed(written: string, { writtenIn, lead, more, also }: ProseMeasure, look: Look): ElementContent[] {
  const classes = ['measure', `measure-${writtenIn}`, ...(look.hasArrows ? ['measure-arrows'] : []), ...(written.length <= longestWhole ? ['measure-whole'] : [])]
  const size = span(classes, [
    ...(look.hasLead ? [{ ...span(['measure-lead'], [text(`${kept(lead)}\u00a0· `)]), properties: { className: ['measure-lead'], hidden: true } }] : []),
    text(written),
    ...(look.hasMore && more !== '' ? [span(['measure-more'], [text(more)])] : []),
  ])
  return look.hasAlso && also !== '' ? [size, span(['measure-also', `measure-${writtenIn}`], [text(` also ${also.split(' · ').map(kept).join(' · ')}`)])] : [size]
}

/** A number stays on one line with its unit. */
const kept = (words: string): string => words.replaceAll(' ', '\u00a0')
const text = (value: string): Text => ({ type: 'text', value })
const span = (className: string[], children: ElementContent[]): Element => ({ type: 'element', tagName: 'span', properties: { className }, children })

/** Replaces a text node by its pieces. */
function dressRun({ parent, node, start }: Run, dressings: readonly Dressing[]): void {
  if (dressings.length === 0) return
  const pieces: ElementContent[] = []
  let from = 0
  for (const dressing of dressings) {
    const [begin, end] = [dressing.start - start, dressing.end - start]
    if (begin > from) pieces.push(text(node.value.slice(from, begin)))
    pieces.push(...dressing.around(node.value.slice(begin, end)))
    from = end
  }
  if (from < node.value.length) pieces.push(text(node.value.slice(from)))
  parent.children.splice(parent.children.indexOf(node), 1, ...pieces)
}
