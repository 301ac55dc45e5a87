// The numbers check: a text's statements sorted, and each judged by the kinds that know it. Pure; shop tables in, verdicts out.
import { findMeasurements } from '../measurements/find-measurements'
import type { Measurement } from '../measurements/measurement'
import type { Finding } from './judge'
import { boltGrip } from './kinds/bolt-length'
import { dashUnits, designation } from './kinds/designation'
import { fastenerHole } from './kinds/fastener-hole'
import { grommetHole } from './kinds/grommet'
import type { Kind } from './kinds/kind'
import { edgeDistance, rivetPitch } from './kinds/rivet-place'
import { drivenHead, lengthForGrip } from './kinds/rivet-shape'
import { flushMethod, sheetBend } from './kinds/sheet'
import { torque } from './kinds/torque'
import { flareAngle, tubeBend } from './kinds/tube'
import { unitEquation } from './kinds/unit-equation'
import { wireCurrent, wirePlace } from './kinds/wire'
import { marksOf } from './marks'
import type { CheckContext, ClaimRole, NumbersCheck } from './numbers-check'
import { quotedSpans, sentencesOf, type Sentence } from './sentences'
import { roleOf, withStanding } from './stance'
import { statementOf, type Statement } from './statement'
import { subjectsOf, type Carried, type Subject } from './subjects'

const kinds: readonly Kind[] = [
  fastenerHole, lengthForGrip, drivenHead, edgeDistance, rivetPitch, torque, grommetHole, tubeBend, flareAngle, sheetBend, flushMethod, boltGrip, designation, dashUnits, unitEquation, wireCurrent, wirePlace,
]
/** Without a measurement or one of these a sentence says nothing that could be looked up. */
const worthReading = /\d|[½¼¾⅛⅜⅝⅞]|\bD\b|diameter|\bthreads?\b|thirty|sixteenth|eighth|twice/i

/** Rules of part numbers are said without a number. */
const aboutNumbering = /\bdash|\bdiameter|\bnumber|\bcode/i

/**
 * Every advised or measured number that a shop table or the kit maker can speak to, in the order of the text.
 * Quoted, asked, negated, supposed and reported numbers are left out. Linear in the length of the text; any string is taken, nothing is thrown.
 */
export function checkNumbers(text: string, context: CheckContext = {}): NumbersCheck[] {
  const measurements = findMeasurements(text)
  const quoted = quotedSpans(text)
  const known = carriedFrom(context.hardware ?? [])
  const found: NumbersCheck[] = []
  let carried = known
  let [measured, quotation] = [0, 0]
  for (const sentence of sentencesOf(text)) {
    while ((measurements[measured]?.end ?? Infinity) <= sentence.start) measured += 1
    while ((quoted[quotation]?.end ?? Infinity) <= sentence.start) quotation += 1
    if (sentence.opens) carried = known
    const own = startingBefore(measurements, measured, sentence.end).filter(({ end }) => end <= sentence.end)
    const read = readSentence(text, sentence, own, startingBefore(quoted, quotation, sentence.end))
    if (!read) continue
    const scene = { statement: read, subjects: subjectsOf(read), carried, limits: context.limits ?? [] }
    if (read.isClaim) found.push(...kinds.flatMap((kind) => kind(scene)).map((finding) => checkOf(text, read.role, finding)))
    carried = carriedOn(carried, scene.subjects)
  }
  return withoutRepeats(found)
}

interface Span { start: number; end: number }

function startingBefore<T extends Span>(spans: readonly T[], from: number, end: number): T[] {
  let to = from
  while ((spans[to]?.start ?? Infinity) < end) to += 1
  return spans.slice(from, to)
}

function readSentence(text: string, { start, end, question }: Sentence, measurements: readonly Measurement[], quoted: readonly Span[]): (Statement & { isClaim: boolean }) | undefined {
  const raw = text.slice(start, end)
  if (measurements.length === 0 && !worthReading.test(raw)) return undefined
  // What stands in quotation marks is blanked: the words round it are the author's own.
  const open = quoted.reduce((rest, span) => {
    const [from, to] = [Math.max(0, span.start - start), Math.min(raw.length, span.end - start)]
    return `${rest.slice(0, from)}${' '.repeat(to - from)}${rest.slice(to)}`
  }, raw)
  const found = marksOf(open, start, measurements.filter((one) => !quoted.some((span) => one.start < span.end && span.start < one.end)))
  if (found.length === 0 && !aboutNumbering.test(open)) return undefined
  const role = roleOf(open, question)
  return { ...statementOf(open, start, role ?? 'advised', withStanding(open, start, role ?? 'advised', found)), isClaim: role !== null }
}

/** What the next sentence may be about: of each kind the one that was spoken of, nothing when there were several. */
function carriedOn(carried: Carried, subjects: readonly Subject[]): Carried {
  if (subjects.length === 0) return carried
  const next = { ...carried }
  for (const kind of ['rivet', 'bolt', 'screw'] as const) {
    const named = subjects.filter((subject) => subject.kind === kind)
    const claimed = named.filter(({ mark }) => mark?.standing === 'claim')
    const [first, ...others] = claimed.length > 0 ? claimed : named
    if (first && others.every(({ inches }) => inches === first.inches)) next[kind] = { kind, inches: first.inches, name: first.name }
    else if (first) delete next[kind]
  }
  return next
}

function carriedFrom(hardware: readonly string[]): Carried {
  const carried: Carried = {}
  for (const kind of ['rivet', 'bolt'] as const) {
    const named = hardware.flatMap((text) => {
      const read = readSentence(text, { start: 0, end: text.length, opens: true, question: false }, findMeasurements(text), [])
      return read ? subjectsOf(read).filter((subject) => subject.kind === kind) : []
    })
    const [first] = named
    if (first && named.every(({ inches }) => inches === first.inches)) carried[kind] = { kind, inches: first.inches, name: first.name }
  }
  return carried
}

function checkOf(text: string, role: ClaimRole, { marks, ...rest }: Finding): NumbersCheck {
  const start = Math.min(...marks.map((mark) => mark.start))
  const end = Math.max(...marks.map((mark) => mark.end))
  return { claim: text.slice(start, end), start, end, role, ...rest }
}

/** Two kinds may know the same statement: one verdict stands, the graver one. */
function withoutRepeats(checks: readonly NumbersCheck[]): NumbersCheck[] {
  const gravity = { conflicts: 2, agrees: 1, 'cannot-tell': 0 }
  const byPlace = new Map<string, NumbersCheck>()
  for (const check of checks) {
    const key = `${check.start}-${check.end}`
    const other = byPlace.get(key)
    if (!other || gravity[check.verdict] > gravity[other.verdict]) byPlace.set(key, check)
  }
  return [...byPlace.values()].sort((a, b) => a.start - b.start || a.end - b.end)
}
