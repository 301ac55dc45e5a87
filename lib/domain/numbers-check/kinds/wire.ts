// Wire: current by gauge and how far apart it is held up. Table 11-9 is for a full bundle, so only a gross excess conflicts.
import wire from '@/content/shop/wire.json'
import { cite } from '../../shop/citation'
import { finding, judge, type Allowed, type Finding } from '../judge'
import { nearestSubject } from '../subjects'
import { behind, before, boundAt, claims, hasAny } from '../statement'
import type { Kind } from './kind'

export const wireCurrent: Kind = ({ statement }) => {
  const gauges = statement.marks.filter(({ what }) => what === 'gauge').map((mark) => ({ mark }))
  return claims(statement).filter(({ what }) => what === 'amps').flatMap((amps): Finding[] => {
    const wireMark = nearestSubject(statement, amps, gauges)?.mark
    const row = wire.sizes.rows.find(([awg]) => awg === (wireMark && wireMark.low < 1 ? '0'.repeat(1 - wireMark.low) : String(wireMark?.low)))
    if (!wireMark || hasAny(statement, 'breaker', 'fuse')) return []
    if (!row) return [finding([wireMark, amps], 'cannot-tell', 'wire')]
    const most = Number(row[3])
    return [finding([wireMark, amps], amps.low <= most ? 'agrees' : amps.low > 2.5 * most ? 'conflicts' : 'cannot-tell', 'wire', `${row[1]} to ${row[3]} A in a full bundle`, cite(wire.sizes.cite))]
  })
}

/** Supports of wire at most 24 in apart; 3/8 in to the edge of a hole. */
export const wirePlace: Kind = ({ statement }) => {
  if (!hasAny(statement, 'wire', 'wires', 'bundle', 'bundles', 'harness', 'wiring')) return []
  const isSupport = hasAny(statement, 'clamp', 'clamps', 'support', 'supports', 'supported', 'tie', 'ties') && /\b(?:every|apart|spacing|spaced|intervals?)\b/.test(statement.text)
  const isClear = /\b(?:edge|hole)\b/.test(statement.text) && /\b(?:clear|clearance|gap|closer|from the edge|away|grommet)\b/.test(statement.text)
  return claims(statement).filter(({ what }) => what === 'length').flatMap((mark): Finding[] => {
    if (isSupport && (/\bevery $/.test(before(statement, mark)) || /^\W*(?:apart|spacing|intervals?)/.test(behind(statement, mark)) || /\b(?:apart|spacing|spaced)\b[^,;]{0,15}$/.test(before(statement, mark)))) {
      const allowed: Allowed = { low: 0, high: wire.support.inches, expected: `at most ${wire.support.inches} in apart`, citation: cite(wire.support.cite) }
      return [judge({ marks: [mark], low: mark.low, high: mark.high, slack: 0.1, table: 'wire', result: 'support' }, [allowed], [])]
    }
    if (!isClear || !/^\W*(?:of |in )?(?:clear|gap|from the|away|to the edge)/.test(behind(statement, mark)) && !/\b(?:clearance|gap|clear|closer than|within)\b[^,;]{0,20}$/.test(before(statement, mark))) return []
    const least = 3 / 8
    const allowed: Allowed = { low: least, high: boundAt(statement, mark) === 'least' ? least : Infinity, expected: 'at least 3/8 in to the edge of a hole', citation: cite(wire.clearance.cite) }
    return [judge({ marks: [mark], low: mark.low, high: mark.high, slack: 0.01, table: 'wire', result: 'clearance' }, [allowed], [], mark.low > least)]
  })
}
