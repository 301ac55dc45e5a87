// Bolts by their dash number: grip, length, the stack they suit, threads past the nut, and the wrong rule that the dash is the grip in sixteenths.
import bolts from '@/content/shop/bolts.json'
import { boltLength, type BoltLength } from '../../shop/bolt-designation'
import { cite } from '../../shop/citation'
import { length } from '../../shop/shop-result'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { before, behind, boundAt, claims, dimensionOf, hasAny, leadOf, nounOf, type Statement } from '../statement'
import type { Kind } from './kind'

/** "AN3-5A" → its bolt and length; null where no source lists it. */
export function boltOf(mark: Mark): BoltLength | null {
  const match = /^(AN\d{1,2})(?:-?(?:C|DD))?(?:-?H)?-?(\d{1,2})A?$/.exec(mark.name)
  return match ? boltLength(match[1] ?? '', Number(match[2])) : null
}

export const boltGrip: Kind = ({ statement, limits }) => {
  const named = statement.marks.filter((mark) => mark.what === 'bolt')
  return [...dashRule(statement), ...threadsShowing(statement), ...claims(statement).flatMap((mark) => {
    if (mark.what !== 'length') return []
    const bolt = nearestBolt(named, mark)
    const said = bolt && sayingOf(statement, mark)
    if (!bolt || !said || !/-\d/.test(bolt.name)) return []
    const entry = boltOf(bolt)
    return [entry ? judged(bolt, mark, entry, said, limits) : finding([bolt, mark], 'cannot-tell', 'bolt')]
  })]
}

function nearestBolt(named: readonly Mark[], mark: Mark): Mark | undefined {
  return named.findLast((bolt) => bolt.start < mark.start) ?? named[0]
}

type Saying = 'grip' | 'length' | 'stack'

function sayingOf(statement: Statement, mark: Mark): Saying | undefined {
  const [front, back] = [before(statement, mark), behind(statement, mark)]
  if (/^\W*(?:in\.? |inch(?:es)? )?(?:of |unthreaded )?(?:grip|shank)\b/.test(back) || /\bgrip(?: length)?(?: is| of|:| =|,)? ?(?:about |a |an )?$/.test(front)) return 'grip'
  if (/^\W*(?:in\.? |inch(?:es)? )?(?:of )?(?:stack|total|through|of material|of metal|of aluminum|of aluminium|thick\b|pile|sandwich|clamped)/.test(back) || /\b(?:stack|through|total|thickness|clamp|clamps|for|material|thick|pile|grips)(?: is| of| up|:)? ?(?:about |a |an |the |total of )?$/.test(front)) {
    return nounOf(statement, mark) === 'hole' || nounOf(statement, mark) === 'bolt' || leadOf(statement, mark) === 'hole' ? undefined : 'stack'
  }
  return dimensionOf(statement, mark) === 'length' ? 'length' : undefined
}

function judged(bolt: Mark, mark: Mark, entry: BoltLength, said: Saying, limits: Parameters<typeof judge>[2]): Finding {
  const source = cite(bolts.lengths.cite, entry.printed ? undefined : 'worked')
  const base = { marks: [bolt, mark], low: mark.low, high: mark.high, table: 'bolt', size: bolt.low }
  const words = `${entry.designation}: grip ${length(entry.grip).display.inch}, ${length(entry.length).display.inch} long`
  if (said === 'stack') {
    // What is too long by up to a sixteenth a washer takes up; two threads may stand in the hole.
    const allowed: Allowed = { low: entry.grip - 0.075, high: entry.grip + 0.006, expected: words, citation: source }
    return judge({ ...base, slack: 0.002, result: 'grip' }, [allowed], limits, mark.low >= entry.grip - 0.13 && mark.high <= entry.grip + 0.063)
  }
  const value = said === 'grip' ? entry.grip : entry.length
  const allowed: Allowed = { low: value, high: value, expected: words, citation: source }
  // Charts print lengths to the next thirty-second.
  return judge({ ...base, slack: Math.max(0.012, Math.min(mark.step / 2, 0.03)), result: said }, [allowed], limits, said === 'length' && Math.abs(mark.low - value) < 0.035)
}

/** The dash of an AN bolt counts eighths of an inch of length; "grip = dash × 1/16" is wrong. */
function dashRule(statement: Statement): Finding[] {
  const { text } = statement
  if (!/\bdash(?:es)?\b|\bsecond number\b|\blast number\b/.test(text) || !/\bbolts?\b|\ban ?\d{0,2}\b/.test(text) || hasAny(statement, 'rivet', 'rivets', 'nas', 'tube', 'tubing', 'hose', 'grommet', 'grommets')) return []
  const part = /\b(eighths?|8ths|sixteenths?|16ths|thirty-?seconds?|32nds|quarters?)\b|(?<![\d/])1\/(8|16|32)(?!\d)/.exec(text)
  const isGrip = /\bgrip\b/.test(text)
  if (!part || statement.marks.some(({ standing }) => standing === 'subject')) return []
  const isEighth = /^(?:eighth|8th)/.test(part[1] ?? '') || part[2] === '8'
  const isFirst = /\b(?:first number|diameter)\b/.test(text)
  if (isFirst) return []
  const start = statement.offset + part.index
  const place: Mark = { type: 'mark', what: 'length', start, end: start + part[0].length, raw: part[0], low: 0, high: 0, step: 0, unit: '', name: '', dimension: '', standing: 'claim' }
  return [finding([place], isEighth ? (isGrip ? 'cannot-tell' : 'agrees') : 'conflicts', 'bolt', 'the dash counts eighths of an inch of the length, its tens whole inches; the grip is the length less the thread', cite(bolts.lengths.cite))]
}

function threadsShowing(statement: Statement): Finding[] {
  if (!/\b(?:showing|show|past|beyond|out of|above|through|proud|protrud\w*|stick\w*|visible|exposed)\b/.test(statement.text) || !/\b(?:nut|nuts|bolt|bolts)\b/.test(statement.text)) return []
  return claims(statement).filter(({ what }) => what === 'threads').map((mark) => {
    const allowed: Allowed[] = bolts.protrusion.map(({ cite: key, threads }) => ({ low: threads, high: threads, expected: `at least ${threads}`, citation: cite(key) }))
    const bound = boundAt(statement, mark)
    return judge({ marks: [mark], low: mark.low, high: mark.low, slack: 0.1, table: 'bolt', result: 'threads-showing-least' }, allowed, [], mark.low > 1 || bound === 'most')
  })
}
