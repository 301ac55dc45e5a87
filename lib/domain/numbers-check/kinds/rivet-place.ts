// Where rivets stand: edge distance, pitch, rows; in inches or in diameters.
import rivets from '@/content/shop/rivets.json'
import { cite } from '../../shop/citation'
import { finalHoles, leastEdge } from '../../shop/rivet-rules'
import { decimalInches } from '../../shop/shop-result'
import { judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { before, behind, boundAt, claims, dimensionOf, hasAny, isUnderOther, nounOf, type Statement } from '../statement'
import { isFlush, paired, spanOf, type Subject } from '../subjects'
import { rivetsOf, type Kind, type Scene } from './kind'

const edgeWords = /\b(?:edges?(?:[ -](?:distance|margin))?|e\.d\.|ed|edge-distance)\b/
const pitchWords = /\b(?:pitch|pitches|spacing|spaced|apart|on cent(?:er|re)s?|cent(?:er|re)s?|cent(?:er|re) to cent(?:er|re)|between rivets|every|space|to each other)\b/

/** Values that may be a distance: not the rivet, not a hole, not a sheet. */
function distances({ statement, subjects }: Scene): Mark[] {
  const taken = new Set(subjects.flatMap(({ mark }) => (mark ? [mark] : [])))
  return claims(statement).filter((mark) => (mark.what === 'length' || mark.what === 'diameters') && !taken.has(mark)
    && !['hole', 'drill', 'sheet', 'grip', 'tube', 'rivet', 'radius', 'wire', 'other', 'washer', 'nut', 'groove', 'bolt', 'screw'].includes(nounOf(statement, mark)) && !(mark.what === 'length' && ['height', 'length', 'depth'].includes(dimensionOf(statement, mark))))
}

const isNoRivet = (statement: Statement): boolean => hasAny(statement, 'wire', 'wires', 'bundle', 'bolt', 'bolts', 'screw', 'screws', 'clamp', 'clamps', 'prop', 'propeller', 'hose', 'tube', 'line', 'lines', 'cable', 'trailing', 'leading', 'bead', 'thread', 'threads', 'ribs', 'studs', 'weld')
  || statement.marks.some(({ what }) => what === 'bolt' || what === 'screw' || what === 'thread')

/** Edge distance from the centre of the hole, or from its rim where the statement says so. */
export const edgeDistance: Kind = (scene) => {
  const { statement } = scene
  if (!edgeWords.test(statement.text) || isNoRivet(statement) || /\bedges? of the (?:holes?|cutout|grommet)\b/.test(statement.text)) return []
  const values = nearWords(statement, distances(scene), edgeWords).filter((value) => !isUnderOther(statement, value, 'edge'))
  return withRivets(scene, values, (value, subject) => {
    const head = isFlush(statement) || subject?.flush ? 'flush' : 'protruding'
    const rule = rivets.edge[head]
    const unit = subject?.inches ?? 1
    const rim = /\b(?:rim|edge of (?:the |a )?hole|hole's edge|edge of hole)\b/.test(statement.text) ? (finalHoles(subject?.name ?? '')[0]?.drill.inches ?? unit) / 2 : 0
    const least = leastEdge(unit, head) - rim
    // What is called the least, and is more than the rule's, no source says: it is no error either.
    const high = boundAt(statement, value) === 'least' ? leastEdge(unit, 'flush') : boundAt(statement, value) === 'most' ? least - 1 : Infinity
    const allowed: Allowed[] = [{ low: least, high, expected: `at least ${rule.d} D${subject ? ` = ${decimalInches(least)} in` : ''}${rim ? ' from the rim' : ''}`, citation: cite(rule.cite, 'worked') }]
    return place(scene, value, subject, allowed, 'edge-centre', value.low >= least)
  })
}

/** Pitch in a row, and the spacing of rows. */
export const rivetPitch: Kind = (scene) => {
  const { statement } = scene
  if (!pitchWords.test(statement.text) || isNoRivet(statement)) return []
  const values = nearWords(statement, distances(scene), pitchWords).filter((value) => !edgeWords.test(behind(statement, value).slice(0, 30)) && !isUnderOther(statement, value, 'apart'))
  const isRow = /\brows?\b[^;]{0,30}\b(?:apart|spacing|spaced|pitch)|\bbetween (?:the )?rows\b|\brow (?:spacing|pitch)|\btransverse\b/.test(statement.text)
  return withRivets(scene, values, (value, subject) => {
    const unit = subject?.inches ?? 1
    const [d, key] = isRow ? [rivets.rowLeast.d, rivets.rowLeast.cite] : [rivets.pitchLeast.d, rivets.pitchLeast.cite]
    const least = d * unit
    const bound = boundAt(statement, value)
    const usual = 10 * unit
    const high = bound === 'least' ? (isRow ? 3 : 4) * unit : usual
    const allowed: Allowed[] = [{ low: least, high, expected: `at least ${d} D${subject ? ` = ${decimalInches(least)} in` : ''}${isRow ? '' : ', usually 4 to 8 D'}`, citation: cite(key, 'worked') }]
    return place(scene, value, subject, allowed, isRow ? 'row-least' : 'pitch-least', value.low >= least && (bound === 'least' || isRow || value.high <= 12 * unit))
  })
}

/** Of several values only those nearest the word: "1/8 rivets, .032 skin, 1/4 from the edge". */
function nearWords(statement: Statement, values: readonly Mark[], words: RegExp): Mark[] {
  const near = values.filter((value) => words.test(behind(statement, value).slice(0, 45)) || words.test(before(statement, value).slice(-45)))
  return near.length > 0 ? near : [...values]
}

function withRivets(scene: Scene, values: readonly Mark[], judged: (value: Mark, subject?: Subject) => Finding): Finding[] {
  const multiples = values.filter(({ what }) => what === 'diameters')
  const lengths = values.filter(({ what }) => what === 'length')
  return [...multiples.map((value) => judged(value)), ...paired(scene.statement, lengths, rivetsOf(scene)).map(({ value, subject }) => judged(value, subject))]
}

function place(scene: Scene, value: Mark, subject: Subject | undefined, allowed: readonly Allowed[], result: string, doubtful: boolean): Finding {
  const slack = subject ? Math.max(0.002, Math.min(value.step / 2, 0.005)) : 0.01
  return judge({ marks: subject ? spanOf(subject, value) : [value], low: value.low, high: value.high, slack, table: 'rivet', result, ...(subject ? { size: subject.inches } : {}), ...(isFlush(scene.statement) || subject?.flush ? { said: { head: 'flush' } } : {}) }, allowed, scene.limits, doubtful)
}
