// Sheet: bend radius by alloy and thickness, countersinking or dimpling a flush rivet.
import bends from '@/content/shop/bends.json'
import countersinks from '@/content/shop/countersink.json'
import { BEND_ALLOYS, radiusRows } from '../../shop/bend-rules'
import { cite } from '../../shop/citation'
import { flushHead, methodBySource, type FlushMethod } from '../../shop/countersink-table'
import { decimalInches } from '../../shop/shop-result'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { behind, before, claims, dimensionOf, hasAny, leadOf, nounOf, type Statement } from '../statement'
import { isFlush, nearestSubject, rivetSize, spanOf, type Subject } from '../subjects'
import type { Kind, Scene } from './kind'
import { tubesOf } from './tube'

/** Least inside radius of a 90-degree bend. */
export const sheetBend: Kind = ({ statement, limits }) => {
  if (!hasAny(statement, 'radius', 'radii', 'bend', 'bends', 'bent', 'bending', 'brake', 'fold', 'folded', 'over', 'tight') || tubesOf(statement).length > 0) return []
  const alloy = statement.marks.find(({ what }) => what === 'alloy')
  const lengths = statement.marks.filter(({ what }) => what === 'length')
  const radii = claims(statement).filter((mark) => mark.what === 'thicknesses' || (mark.what === 'length' && isRadius(statement, mark)))
  const sheet = lengths.find((mark) => !radii.includes(mark) && mark.low < 0.3)
  return radii.flatMap((radius) => (alloy ? [judgedBend(alloy, sheet, radius, limits)] : []))
}

/** Named a radius, or else what the sheet is bent over. */
function isRadius(statement: Statement, mark: Mark): boolean {
  if (nounOf(statement, mark) === 'radius' || leadOf(statement, mark) === 'radius' || /^\W*(?:in\.? )?(?:inside |bend )*r(?:adius)?\b/.test(behind(statement, mark))) return true
  return !/\bradi(?:us|i)\b/.test(statement.text) && /\b(?:over|around|round|to|on|at)(?: an?| the)? $/.test(before(statement, mark))
}

function judgedBend(alloy: Mark, sheet: Mark | undefined, radius: Mark, limits: Scene['limits']): Finding {
  const marks = [alloy, ...(sheet ? [sheet] : []), radius]
  if (!sheet || !BEND_ALLOYS.includes(alloy.name)) return finding(marks, 'cannot-tell', 'bend')
  const thickness = sheet.low
  const rows = radiusRows(alloy.name, thickness)
  const least = rows.map(({ minTimes }) => minTimes * thickness)
  const allowed: Allowed[] = rows.length === 0 ? [] : [{ low: Math.max(...least), high: Infinity, expected: `at least ${rows.map(({ minTimes, maxTimes, thickness: row }) => `${minTimes} to ${maxTimes} t (row ${decimalInches(row)})`).join(', ')}`, citation: cite(bends.radii.cite, 'worked') }]
  const scale = radius.what === 'thicknesses' ? thickness : 1
  return judge({ marks, low: radius.low * scale, high: radius.high * scale, slack: Math.max(0.002, thickness * 0.03), table: 'bend', result: 'radius-least', size: thickness, said: { alloy: alloy.name } }, allowed, limits, radius.low * scale >= Math.min(...least))
}

const cutting = /\b(?:machine[ -]|press[ -]|drill[ -])?(?:counter ?-?sink|countersinks|countersunk|countersinking|csk|csunk)\b/
const dimpling = /\bdimpl(?:e|es|ed|ing)\b/

/** Which method each source names for a flush rivet in a sheet. */
export const flushMethod: Kind = (scene) => {
  const { statement } = scene
  const method = methodOf(statement)
  const rivets = scene.subjects.filter(({ kind }) => kind === 'rivet')
  const taken = new Set(scene.subjects.flatMap(({ mark }) => (mark ? [mark] : [])))
  const others = claims(statement).filter((mark) => mark.what === 'length' && !taken.has(mark))
  const angles = angle(scene)
  const depths = others.filter((mark) => ['depth', 'height', 'width'].includes(dimensionOf(statement, mark)) && /\bheads?\b/.test(statement.text)).flatMap((mark) => headSize(statement, mark, rivets))
  if (!method || scene.subjects.some(({ kind }) => kind !== 'rivet')) return [...angles, ...depths]
  const sheets = others.filter((mark) => mark.low <= 0.2 && mark.low >= 0.01 && (!rivetSize(mark.low) || nounOf(statement, mark) === 'sheet' || !mark.raw.includes('/')) && (dimensionOf(statement, mark) === '' || dimensionOf(statement, mark) === 'height'))
  const chosen = depths.length > 0 ? [] : sheets.slice(0, 1)
  return [...angles, ...depths, ...chosen.map((sheet) => judgedMethod(method, sheet, nearestSubject(statement, sheet, rivets) ?? scene.carried.rivet))]
}

/** The one method a statement advises; none when it weighs both. */
function methodOf(statement: Statement): FlushMethod | undefined {
  // "Flush head, countersunk" is the rivet; the verb or "can be" makes it a method.
  const [cut, dimple] = [cutting.test(statement.text), dimpling.test(statement.text)]
  if (cut && dimple) return undefined
  return cut ? 'countersink' : dimple ? 'dimple' : undefined
}

function judgedMethod(method: FlushMethod, sheet: Mark, subject: Subject | undefined): Finding {
  const marks = subject ? spanOf(subject, sheet) : [sheet]
  const said = [
    { method: subject ? methodBySource.head(sheet.low, subject.name) : null, key: countersinks.headRule.cite, words: `head ${decimalInches(flushHead(subject?.name ?? '')?.headHeight ?? 0)} in deep: ` },
    { method: methodBySource.handbook(sheet.low), key: countersinks.dimpleUpTo.cite, words: '' }, { method: methodBySource.p40(sheet.low), key: countersinks.countersinkFrom.cite, words: '' },
  ]
  const spoken = said.filter((source) => source.method !== null)
  const fitting = spoken.find((source) => source.method === method)
  const [first] = spoken
  const named = fitting ?? first
  return finding(marks, fitting ? 'agrees' : first ? 'conflicts' : 'cannot-tell', 'countersink-or-dimple', named && `${named.words}${named.method ?? ''} ${decimalInches(sheet.low)} in`, named && cite(named.key))
}

function angle({ statement, subjects }: Scene): Finding[] {
  const rivet = isFlush(statement) && (subjects.some(({ kind }) => kind === 'rivet') || statement.marks.some(({ what }) => what === 'head') || hasAny(statement, 'rivet', 'rivets'))
  if (!rivet || !(cutting.test(statement.text) || dimpling.test(statement.text) || hasAny(statement, 'head', 'heads', 'flush'))) return []
  const { angle: degrees, cite: key } = countersinks.heads
  return claims(statement).filter((mark) => mark.what === 'angle' && mark.low >= 60 && mark.low <= 130 && mark.low !== 90)
    .map((mark) => finding([mark], Math.abs(mark.low - degrees) < 0.5 ? 'agrees' : 'conflicts', 'countersink-or-dimple', `${degrees} degrees`, cite(key)))
}

/** "The head of a 1/8 flush rivet is .042 deep". */
function headSize(statement: Statement, mark: Mark, rivets: readonly Subject[]): Finding[] {
  const subject = nearestSubject(statement, mark, rivets)
  const head = subject && isFlush(statement) ? flushHead(subject.name) : null
  if (!subject || !head || /\b(?:shop|driven|bucked|tails?)\b/.test(statement.text)) return []
  const value = dimensionOf(statement, mark) === 'width' ? head.headDiameter : head.headHeight
  const allowed: Allowed = { low: value, high: value, expected: `${decimalInches(value)} in`, citation: cite(countersinks.heads.cite) }
  return [judge({ marks: spanOf(subject, mark), low: mark.low, high: mark.high, slack: Math.max(0.003, mark.step / 2), table: 'countersink-or-dimple', result: 'head-height', size: subject.inches }, [allowed], [])]
}
