// Tube and hose: bend radius and flare angle. Torque of their nuts is torque.ts.
import tubeData from '@/content/shop/tubes.json'
import { cite } from '../../shop/citation'
import { decimalInches, length } from '../../shop/shop-result'
import { tubeBendRadius } from '../../shop/tube-table'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { behind, before, claims, hasAny, leadOf, nounOf, type Statement } from '../statement'
import { nearestSubject } from '../subjects'
import type { Kind } from './kind'

export interface Tube { mark: Mark; size: number }

/** Tubes and hoses named by dash number or outside diameter. */
export function tubesOf(statement: Statement): Tube[] {
  return statement.marks.flatMap((mark) => {
    if (mark.what === 'tube') return [{ mark, size: mark.low }]
    const sixteenths = mark.low * 16
    const whole = Math.abs(sixteenths - Math.round(sixteenths)) < 0.05
    return mark.what === 'length' && whole && isTube(statement, mark) ? [{ mark, size: Math.round(sixteenths) }] : []
  })
}

function isTube(statement: Statement, mark: Mark): boolean {
  if (leadOf(statement, mark) === 'radius' || /\bradius\b|\bradii\b/.test(behind(statement, mark).slice(0, 20))) return false
  const noun = nounOf(statement, mark)
  return noun === 'tube' || noun === 'hose' || /^\W*(?:in\.? )?(?:o\.?d\.?|outside)\b/.test(behind(statement, mark)) || (noun === 'sheet' && /^\W*(?:\w+ )?(?:tube|tubing|line|pipe)/.test(behind(statement, mark)))
    || (noun === 'nut' && /^\W*(?:\w+ )?flared?\b/.test(behind(statement, mark))) || /\b(?:tubes?|tubing|line|pipe)(?: of)? $/.test(before(statement, mark))
}

/** Least radius to the centre line. */
export const tubeBend: Kind = ({ statement, limits }) => {
  if (!hasAny(statement, 'radius', 'radii', 'bend', 'bends', 'bent', 'bending')) return []
  const tubes = tubesOf(statement)
  const taken = new Set(tubes.map(({ mark }) => mark))
  const radii = claims(statement).filter((mark) => mark.what === 'length' && !taken.has(mark) && !['wall', 'hole'].includes(nounOf(statement, mark)) && !/^\W*(?:wall|thick)/.test(behind(statement, mark)))
  const near = radii.filter((mark) => nounOf(statement, mark) === 'radius' || leadOf(statement, mark) === 'radius')
  return (near.length > 0 ? near : radii).flatMap((value) => {
    const tube = nearestSubject(statement, value, tubes)
    if (!tube) return []
    const marks = [tube.mark, value]
    const bends = hasAny(statement, 'hose', 'hoses') ? hoseBend(tube.size) : tubeBends(statement, tube.size)
    const isDiameter = /^\W*(?:diameter|dia)\b/.test(behind(statement, value))
    if (bends.length === 0 || isDiameter) return [finding(marks, 'cannot-tell', 'tube')]
    return [judge({ marks, low: value.low, high: value.high, slack: Math.max(0.005, value.step / 2), table: 'tube', result: 'bend-radius', size: tube.size / 16 }, bends, limits, bends.length > 1 && value.low >= Math.min(...bends.map(({ low }) => low)))]
  })
}

function tubeBends(statement: Statement, size: number): Allowed[] {
  const joint = hasAny(statement, 'steel', 'stainless') ? 'steel' as const : 'aluminium' as const
  const least = tubeBendRadius(size, joint)
  return least === null ? [] : [{ low: least, high: Infinity, expected: `at least ${length(least).display.inch} to the centre line (-${size} ${joint})`, citation: cite(tubeData.bends.cite) }]
}

function hoseBend(size: number): Allowed[] {
  const row = tubeData.hoses.rows.find((known) => known.size === size)
  return row ? [{ low: row.bendRadius, high: Infinity, expected: `at least ${decimalInches(row.bendRadius, 2)} in (${tubeData.hoses.series}-${size})`, citation: cite(tubeData.hoses.cite) }] : []
}

/** 37 degrees on AN fittings. */
export const flareAngle: Kind = ({ statement }) => {
  if (!hasAny(statement, 'flare', 'flares', 'flared', 'flaring') || hasAny(statement, 'car', 'automotive', 'gas', 'lights', 'landing')) return []
  const { degrees, cite: key } = tubeData.flareAngle
  return claims(statement).flatMap((mark): Finding[] => {
    if (mark.what !== 'angle') return []
    const isFlare = Math.abs(mark.low - degrees) < 0.6 || Math.abs(mark.low - 2 * degrees) < 0.6
    const isAn = /\ban\b|\bms\b|aircraft|airplane|aeroplane|brake|fuel|b-nut/.test(statement.text) || statement.marks.some(({ what }) => what === 'tube')
    return [finding([mark], isFlare ? 'agrees' : isAn ? 'conflicts' : 'cannot-tell', 'tube', `${degrees} degrees`, cite(key))]
  })
}
