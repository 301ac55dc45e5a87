// The hole for a grommet: from its designation, its bore or its groove.
import { cite, COMMON_PRACTICE } from '../../shop/citation'
import { length } from '../../shop/shop-result'
import { decodeGrommet, GROMMETS, grommetsOfBore } from '../../shop/grommet-rules'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { before, behind, claims, leadOf, nounOf, type Statement } from '../statement'
import { paired } from '../subjects'
import type { Kind } from './kind'

interface Bored { mark: Mark; bore?: number; holes: Allowed[] }

export const grommetHole: Kind = ({ statement, limits }) => {
  if (!/\bgrommets?\b/.test(statement.text) && !statement.marks.some(({ what }) => what === 'grommet')) return []
  const holes = claims(statement).filter((mark) => (mark.what === 'length' || mark.what === 'drill') && isHole(statement, mark))
  const bored = grommetsOf(statement, holes)
  const bores = claims(statement).filter((mark) => mark.what === 'length' && !holes.includes(mark) && isBore(statement, mark))
  return [
    ...paired(statement, holes, bored).map(({ value, subject }) => judged(value, subject, limits)),
    ...bores.flatMap((mark) => boreOf(statement, mark)),
  ]
}

/** A hole in the sheet, or what is said to be cut for the grommet. */
function isHole(statement: Statement, mark: Mark): boolean {
  const noun = nounOf(statement, mark)
  if (noun === 'hole' || noun === 'drill') return !/^\W*(?:inside|bore|id|i\.d\.)\b/.test(behind(statement, mark))
  if (noun === 'grommet' || noun === 'groove' || isBore(statement, mark) || /^\W*(?:in\.? )?(?:bore|id|i\.d\.|inside|wire|tube|cable|conduit|bundle|sheet|skin)\b/.test(behind(statement, mark))) return false
  return mark.what === 'drill' || leadOf(statement, mark) === 'hole' || /\b(?:holes?|drill|punch|bore|cut|needs?|takes?|wants?|fits?|goes in(?:to)?|for|step drill to|in)\b[^,;]{0,40}$/.test(before(statement, mark))
}

const isBore = (statement: Statement, mark: Mark): boolean => /^\W*(?:in\.? )?(?:bore|id|i\.d\.|inside)\b/.test(behind(statement, mark)) || /\b(?:bore|id|i\.d\.|inside diameter|inside)(?: is| of|:)? $/.test(before(statement, mark))

function grommetsOf(statement: Statement, holes: readonly Mark[]): Bored[] {
  return statement.marks.flatMap((mark): Bored[] => {
    if (mark.what === 'grommet') {
      const grommet = decodeGrommet(mark.name) ?? GROMMETS.find(({ also }) => also === mark.name)
      return [grommet ? { mark, bore: grommet.bore, holes: [allowedHole(grommet.hole, grommet.cite)] } : { mark, holes: [] }]
    }
    if (mark.what !== 'length' || holes.includes(mark)) return []
    if (nounOf(statement, mark) === 'groove' || leadOf(statement, mark) === 'groove') return [{ mark, holes: [{ ...allowedHole(mark.low, 'grommet-list'), citation: COMMON_PRACTICE }] }]
    if (nounOf(statement, mark) !== 'grommet' && !isBore(statement, mark) && !/\bgrommet(?: of)? $/.test(before(statement, mark))) return []
    return [{ mark, bore: mark.low, holes: grommetsOfBore(mark.low).map(({ hole, cite: key }) => allowedHole(hole, key)) }]
  })
}

const allowedHole = (hole: number, key: string): Allowed => ({ low: hole, high: hole, expected: `${length(hole).display.inch}; measure the groove of the grommet in hand`, citation: cite(key) })

function judged(hole: Mark, { mark, bore, holes }: Bored, limits: Parameters<typeof judge>[2]): Finding {
  const marks = [mark, hole]
  if (holes.length === 0 && bore !== undefined && hole.high <= bore) return finding(marks, 'conflicts', 'grommet', 'larger than the bore: the sheet sits in the groove', COMMON_PRACTICE)
  return judge({ marks, low: hole.low, high: hole.high, slack: Math.max(0.006, Math.min(0.01, hole.step / 2)), table: 'grommet', result: 'hole', ...(bore === undefined ? {} : { size: bore }) }, holes, limits)
}

/** "AN931-6-10 has a 3/8 bore". */
function boreOf(statement: Statement, mark: Mark): Finding[] {
  const named = statement.marks.find(({ what }) => what === 'grommet')
  const grommet = decodeGrommet(named?.name ?? '')
  if (!named || !grommet) return []
  const allowed: Allowed = { low: grommet.bore, high: grommet.bore, expected: `${length(grommet.bore).display.inch} bore`, citation: cite(grommet.cite) }
  return [judge({ marks: [named, mark], low: mark.low, high: mark.high, slack: 0.006, table: 'grommet', result: 'bore', size: grommet.bore }, [allowed], [])]
}
