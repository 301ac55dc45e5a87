// What a statement is about: which rivet, bolt or screw, by name, by size, or carried over from the sentence before and the entry's hardware.
import { fractionOfInch } from '../shop/exact-fraction'
import { boltThread } from '../shop/bolt-designation'
import { RIVET_DIAMETERS } from '../shop/rivet-rules'
import { machineScrewDiameter } from '../shop/screw-clearance'
import { inchesOf } from '../shop/exact-fraction'
import type { Mark } from './marks'
import { before, behind, hasAny, leadOf, nounOf, placeOf, wordAt, type Statement } from './statement'

export type SubjectKind = 'rivet' | 'bolt' | 'screw'
export interface Subject {
  kind: SubjectKind
  /** Absent when carried over: then it is no part of the span. */
  mark?: Mark
  inches: number
  /** "1/8", "AN3", "10-32" or "#8". */
  name: string
  /** Of a designation: inches. */
  length?: number
  flush?: boolean
}
/** The last of each kind that was spoken of. */
export type Carried = Partial<Record<SubjectKind, Subject>>

const rivetSizes = RIVET_DIAMETERS.map((size) => ({ size, inches: inchesOf(size) }))

/** The stock diameter ("1/8") a length says, whether as fraction, decimal or millimetres; undefined for any other. */
export function rivetSize(inches: number): string | undefined {
  return rivetSizes.find((known) => Math.abs(known.inches - inches) < 0.0016)?.size
}

export const isFlush = (statement: Statement): boolean =>
  hasAny(statement, 'flush', 'countersunk', 'csk', 'dimple', 'dimpled', 'dimples', 'dimpling') || statement.marks.some(({ what, name }) => (what === 'head' && name === 'flush') || (what === 'rivet' && /426|NAS1097/.test(name)))
export const isBlind = (statement: Statement): boolean => hasAny(statement, 'blind', 'pop', 'pull', 'pulled', 'pull-stem', 'cherry', 'cherrymax')

/** Every rivet, bolt and screw a statement names, in its order. */
export function subjectsOf(statement: Statement): Subject[] {
  const found = statement.marks.flatMap((mark) => {
    const subject = subjectOf(statement, mark)
    return subject ? [subject] : []
  })
  return found.length > 0 ? found : forFraction(statement)
}

function subjectOf(statement: Statement, mark: Mark): Subject | undefined {
  switch (mark.what) {
    case 'rivet': return { kind: 'rivet', mark, inches: mark.low, name: rivetSize(mark.low) ?? '', ...(mark.length ? { length: mark.length } : {}), ...(/426|1097/.test(mark.name) ? { flush: true } : {}) }
    case 'bolt': { const bolt = /^AN\d+/.exec(mark.name)?.[0] ?? ''; return boltThread(bolt) ? { kind: 'bolt', mark, inches: mark.low, name: bolt } : undefined }
    case 'screw': { const inches = machineScrewDiameter(Number(mark.name)); return inches === null ? undefined : { kind: 'screw', mark, inches, name: `#${mark.name}` } }
    case 'thread': return { kind: /^(?:[0-9]|1[0-2])-/.test(mark.name) && nounOf(statement, mark) !== 'bolt' ? 'screw' : 'bolt', mark, inches: mark.low, name: mark.name }
    case 'length': return lengthSubject(statement, mark)
    default: return undefined
  }
}

function lengthSubject(statement: Statement, mark: Mark): Subject | undefined {
  const noun = nounOf(statement, mark)
  if (noun === 'bolt' || noun === 'screw') return { kind: 'bolt', mark, inches: mark.low, name: fractionOfInch(mark.low) ?? '' }
  const size = rivetSize(mark.low)
  if (!size || mark.low !== mark.high) return undefined
  const isRivet = noun === 'rivet' || (noun === 'head' && !hasAny(statement, 'tube', 'hose') && hasHeadWords(statement, mark)) || (noun === '' && isFlushFraction(statement, mark)) || (noun === '' && isRivetOf(statement, mark))
  return isRivet ? { kind: 'rivet', mark, inches: inchesOf(size), name: size } : undefined
}

/** "1/8 shop heads", "5/32 driven head". */
const hasHeadWords = (statement: Statement, mark: Mark): boolean => /^\W*(?:rivet |in\.? )?(?:shop|driven|bucked|formed|upset|round|flush|universal)[ -]?heads?/.test(behind(statement, mark))
/** "flush 5/32 in .040", "1/8 flush in .063". */
const isFlushFraction = (statement: Statement, mark: Mark): boolean => mark.raw.includes('/') && (/^\W*flush\b/.test(behind(statement, mark)) || /\bflush\s*$/.test(before(statement, mark)))
/** "rivets of 1/8", "the rivet is 1/8", "rivet: 1/8", "rivet size 1/8". */
const isRivetOf = (statement: Statement, mark: Mark): boolean => statement.items[placeOf(statement, mark) - 3]?.type !== 'mark' && leadOf(statement, mark) === 'rivet' && /\brivets?(?: size| diameter| dia)?(?: of| is| are|:) $/.test(before(statement, mark)) && mark.raw.includes('/')

/** "#30 for 1/8", "for 1/8, #30": a rivet's size beside a number drill, where nothing else is spoken of. */
function forFraction(statement: Statement): Subject[] {
  const isOfHeads = hasAny(statement, 'tail', 'tails', 'shop-head', 'edge') || /\b(?:formed|shop|driven|bucked)[ -]heads?\b/i.test(statement.text)
  if (!(isOfHeads || statement.marks.some(({ what }) => what === 'drill')) || hasAny(statement, 'bolt', 'bolts', 'screw', 'screws', 'tap', 'wire', 'tube', 'pin', 'pins', 'hinge', 'grommet', 'bushing', 'cable')) return []
  return statement.marks.flatMap((mark) => {
    const size = mark.what === 'length' && mark.raw.includes('/') && nounOf(statement, mark) === '' ? rivetSize(mark.low) : undefined
    const at = placeOf(statement, mark)
    const lead = ['the', 'a', 'an'].includes(wordAt(statement, at - 1)) ? wordAt(statement, at - 2) : wordAt(statement, at - 1)
    return size && (lead === 'for' || (isOfHeads && lead === 'on') || ['takes', 'take', 'gets', 'get', 'wants', 'needs'].includes(wordAt(statement, at + 1))) ? [{ kind: 'rivet' as const, mark, inches: inchesOf(size), name: size }] : []
  })
}

/** The nearest subject to a mark, on either side; the one in front of it at the same distance comes second. */
export function nearestSubject<T extends { mark?: Mark }>(statement: Statement, mark: Mark, subjects: readonly T[]): T | undefined {
  const at = placeOf(statement, mark)
  let best: T | undefined
  let distance = Infinity
  for (const subject of subjects) {
    const place = subject.mark ? placeOf(statement, subject.mark) : 0
    const away = Math.abs(place - at) + (place < at ? 0.5 : 0)
    if (away < distance) [best, distance] = [subject, away]
  }
  return best
}

/** One value to one subject each: in order when there are as many of both, else the nearest. */
export function paired<T extends { mark?: Mark }>(statement: Statement, values: readonly Mark[], subjects: readonly T[]): { value: Mark; subject: T }[] {
  return values.flatMap((value, index) => {
    const subject = values.length === subjects.length ? subjects[index] : nearestSubject(statement, value, subjects)
    return subject ? [{ value, subject }] : []
  })
}

/** The span of a subject and what is claimed of it. */
export const spanOf = (subject: Subject, ...values: readonly Mark[]): Mark[] => [...(subject.mark ? [subject.mark] : []), ...values]
